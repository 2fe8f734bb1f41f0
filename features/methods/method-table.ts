import type { Method } from './method'

/** Written by `npm run methods` from the steps that the engine makes; never by hand. */
export const METHODS: readonly Method[] = [
  {
    id: '15wmec1',
    symbol: 'Pjack',
    meaning: 'Force while jacking',
    formula: 'n * (r * Fpk)',
    unit: 'N',
    families: ['bearing', 'bursting-thickness', 'bursting-plan', 'spalling', 'joint', 'pan-bars', 'tendon'],
    clauses: [
      {
        source: 'Statics',
        section: 'strands times force',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 4 × 0.8 × 184 = 588.8 kN',
        test: 'tests/engine/tendon.test.ts',
        name: 'live: the jacking force, 4 x 0.8 x 184 = 588.8 kN, whatever the setting',
      },
    ],
  },
  {
    id: 'c8d6xo',
    symbol: 'plan',
    meaning: 'Bends in plan; none between straight ends',
    formula: 'θ1 + … + θn',
    unit: 'rad',
    families: ['bearing', 'bursting-thickness', 'bursting-plan', 'tendon'],
    clauses: [
      {
        source: 'Geometry of the tendon',
        section: 'sum of its changes of direction',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two bends of 45°: e^(-0.2 π / 2)',
        test: 'tests/engine/tendon.test.ts',
        name: 'counts a bend in plan by its angle: 45 degrees and back are a half of pi',
      },
    ],
  },
  {
    id: 'jmeqa8',
    symbol: 'theta',
    meaning: 'Total change of angle',
    formula: 'plan + drape',
    unit: 'rad',
    families: ['bearing', 'bursting-thickness', 'bursting-plan', 'tendon'],
    clauses: [
      {
        source: 'Geometry of the tendon',
        section: 'sum of its changes of direction',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two bends of 45°: e^(-0.2 π / 2)',
        test: 'tests/engine/tendon.test.ts',
        name: 'counts a bend in plan by its angle: 45 degrees and back are a half of pi',
      },
    ],
  },
  {
    id: '16ivdbw',
    symbol: 'u',
    meaning: 'Exponent of friction over the whole tendon',
    formula: 'mu * (theta + k * L)',
    unit: '-',
    families: ['bearing', 'bursting-thickness', 'bursting-plan', 'tendon'],
    clauses: [
      {
        source: 'Friction along a tendon',
        section: 'wobble inside mu (EN 1992-1-1 Eq. 5.45, AS 3600 3.4.2.4)',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX19 (derived): u 0.1026: 885.6 to 799.24 kN',
        test: 'tests/published/friction.test.ts',
        name: 'far end 799.24 kN: 885.6 x e^-0.1026',
      },
    ],
  },
  {
    id: '11tdavy',
    symbol: 'P',
    meaning: 'Force at the end of a stage of stressing',
    formula: 'share * Pjack',
    unit: 'N',
    families: ['bearing', 'bursting-thickness', 'bursting-plan', 'spalling', 'pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'strands times force',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (Eq. 6.63, digest): 0.25 × 706.56 kN on 33,660 mm²: 5.25 MPa; 9 / 1.5 × 1.8333 = 11.0 MPa',
        test: 'tests/engine/bearing.test.ts',
        name: 'the same plate at 25 % of the force, 9 MPa',
      },
    ],
  },
  {
    id: '1tl8m4v',
    symbol: 'F',
    meaning: 'Design force',
    formula: 'gammaP * P',
    unit: 'N',
    families: ['bearing', 'bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '2.4.2.2(3)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX17 (digest): P 800 kN, slab 200, plate 75: F 960 kN, T 150 kN, 500 mm² at 300 MPa',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'thickness: plate 75 in a 200 slab',
      },
    ],
  },
  {
    id: '1sumkvr',
    symbol: 'Ac0',
    meaning: 'Gross area of the plate',
    formula: 'w * h',
    unit: 'mm2',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.7(2) Eq. 6.63',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two plates of 170 at 260, hole 72: 24,828 mm², 49.80 MPa against 22.43',
        test: 'tests/engine/bearing.test.ts',
        name: 'two beam plates of 170 at 260: k = 260 / 170 = 1.529',
      },
    ],
  },
  {
    id: 'pmavwm',
    symbol: 'Anet',
    meaning: 'Area that bears: plate less hole',
    formula: 'Ac0 - Ahole',
    unit: 'mm2',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.7(2) Eq. 6.63',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two plates of 170 at 260, hole 72: 24,828 mm², 49.80 MPa against 22.43',
        test: 'tests/engine/bearing.test.ts',
        name: 'two beam plates of 170 at 260: k = 260 / 170 = 1.529',
      },
    ],
  },
  {
    id: '4t21ac',
    symbol: 'k',
    meaning: 'Enlargement of the plate to the supporting area of its shape',
    formula: 'min(bFree / w, hFree / h, kMax)',
    unit: '-',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.7(3) Fig. 6.29',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two plates of 170 at 260, hole 72: 24,828 mm², 49.80 MPa against 22.43',
        test: 'tests/engine/bearing.test.ts',
        name: 'two beam plates of 170 at 260: k = 260 / 170 = 1.529',
      },
    ],
  },
  {
    id: '1u64n0z',
    symbol: 'Ac1',
    meaning: 'Supporting area',
    formula: 'k * k * Ac0',
    unit: 'mm2',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.7(3) Fig. 6.29',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two plates of 170 at 260, hole 72: 24,828 mm², 49.80 MPa against 22.43',
        test: 'tests/engine/bearing.test.ts',
        name: 'two beam plates of 170 at 260: k = 260 / 170 = 1.529',
      },
    ],
  },
  {
    id: '142qeku',
    symbol: 'sigma',
    meaning: 'Pressure on the net area',
    formula: 'F / Anet',
    unit: 'MPa',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.7(2) Eq. 6.63',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand (Eq. 6.63, digest): 0.25 × 706.56 kN on 33,660 mm²: 5.25 MPa; 9 / 1.5 × 1.8333 = 11.0 MPa',
        test: 'tests/engine/bearing.test.ts',
        name: 'the same plate at 25 % of the force, 9 MPa',
      },
      {
        value: 'By hand: two plates of 170 at 260, hole 72: 24,828 mm², 49.80 MPa against 22.43',
        test: 'tests/engine/bearing.test.ts',
        name: 'two beam plates of 170 at 260: k = 260 / 170 = 1.529',
      },
    ],
  },
  {
    id: '33e0du',
    symbol: 'fcd',
    meaning: 'Design strength of the concrete at this stage',
    formula: 'alphaCc * fck / gammaC',
    unit: 'MPa',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '3.1.6(1)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand (Eq. 6.63, digest): 0.25 × 706.56 kN on 33,660 mm²: 5.25 MPa; 9 / 1.5 × 1.8333 = 11.0 MPa',
        test: 'tests/engine/bearing.test.ts',
        name: 'the same plate at 25 % of the force, 9 MPa',
      },
    ],
  },
  {
    id: 'boeseo',
    symbol: 'sigmaRd',
    meaning: 'Largest pressure',
    formula: 'min(fcd * sqrt(Ac1 / Ac0), 3 * fcd)',
    unit: 'MPa',
    families: ['bearing'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.7(2) Eq. 6.63',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand (Eq. 6.63, digest): 0.25 × 706.56 kN on 33,660 mm²: 5.25 MPa; 9 / 1.5 × 1.8333 = 11.0 MPa',
        test: 'tests/engine/bearing.test.ts',
        name: 'the same plate at 25 % of the force, 9 MPa',
      },
    ],
  },
  {
    id: 'hwncrs',
    symbol: 'Pfar',
    meaning: 'Force at the far end after friction',
    formula: 'Pjack * exp(0 - u)',
    unit: 'N',
    families: ['bearing', 'bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'Friction along a tendon',
        section: 'wobble inside mu (EN 1992-1-1 Eq. 5.45, AS 3600 3.4.2.4)',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
      {
        source: 'Friction along a tendon',
        section: 'wobble beside mu (ACI 318-11 18.6.2, JTG 3362 6.2.2)',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 0.15 × (0.3 + 0.005 × 17.18) = 0.057885: 588.8 e^-0.057885',
        test: 'tests/engine/tendon.test.ts',
        name: 'dead: the jacking force, or after friction with the lowest pair (Eq. 5.45, from memory)',
      },
    ],
  },
  {
    id: '1jk1j13',
    symbol: 'u',
    meaning: 'Exponent of friction over the whole tendon',
    formula: 'mu * theta + k * L',
    unit: '-',
    families: ['bearing', 'bursting-thickness', 'bursting-plan', 'tendon'],
    clauses: [
      {
        source: 'Friction along a tendon',
        section: 'wobble beside mu (ACI 318-11 18.6.2, JTG 3362 6.2.2)',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'Krishna Raju (from memory): losses 50.5, 34.3 and 17.9 MPa of 1200; 51.6, 34.8 and 18.0 by the linear form',
        test: 'tests/published/friction.test.ts',
        name: 'drape $drape: exact $exact, printed $linear by the linear form',
      },
    ],
  },
  {
    id: '142wthj',
    symbol: 'A1',
    meaning: 'Gross area of the plate',
    formula: 'w * h',
    unit: 'mm2',
    families: ['bearing'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
      },
    ],
  },
  {
    id: '1m41qpc',
    symbol: 'Anet',
    meaning: 'Area that bears: plate less hole',
    formula: 'A1 - Ahole',
    unit: 'mm2',
    families: ['bearing'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
      },
    ],
  },
  {
    id: '1sgkjzj',
    symbol: 'k',
    meaning: 'Enlargement of the plate to the supporting area of its shape',
    formula: 'min(bFree / w, hFree / h)',
    unit: '-',
    families: ['bearing'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
      },
    ],
  },
  {
    id: 'o4y1h9',
    symbol: 'A2',
    meaning: 'Supporting area',
    formula: 'k * k * A1',
    unit: 'mm2',
    families: ['bearing'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
      },
    ],
  },
  {
    id: '1le98ip',
    symbol: 'sigma',
    meaning: 'Pressure on the net area',
    formula: 'kP * P / Anet',
    unit: 'MPa',
    families: ['bearing'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
      },
    ],
  },
  {
    id: '1vgambs',
    symbol: 'phiFb',
    meaning: 'Largest pressure at the strength of this stage',
    formula: 'phi * min(0.9 * fc * sqrt(A2 / A1), 1.8 * fc)',
    unit: 'MPa',
    families: ['bearing'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value:
          'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
      },
    ],
  },
  {
    id: 't14on3',
    symbol: 'T',
    meaning: 'Bursting force, partial discontinuity',
    formula: '0.25 * F * (b - a) / b',
    unit: 'N',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.5.3(3) Eq. 6.58',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX17 (digest): P 800 kN, slab 200, plate 75: F 960 kN, T 150 kN, 500 mm² at 300 MPa',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'thickness: plate 75 in a 200 slab',
      },
      {
        value: 'EX17 (digest): plate 220 at spacing 1000: T 187.2 kN, 624 mm²',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'plan: plate 220 at spacing 1000',
      },
    ],
  },
  {
    id: '5gfjla',
    symbol: 'fyd',
    meaning: 'Design yield strength',
    formula: 'fyk / gammaS',
    unit: 'MPa',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '2.4.2.4(1), 3.2.7',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: T 150 kN, fyd 217.4 MPa: 690 mm²; with fyd 434.8 MPa 416.7 mm²',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'with a low yield strength the first part of the alternative governs',
      },
    ],
  },
  {
    id: '1p5my0g',
    symbol: 'As',
    meaning: 'Steel asked for: strength with the factored force, crack width with the unfactored force',
    formula: 'max(T / fyd, T / gammaP / sigmaS)',
    unit: 'mm2',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.3(4)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: T 150 kN, fyd 217.4 MPa: 690 mm²; with fyd 434.8 MPa 416.7 mm²',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'with a low yield strength the first part of the alternative governs',
      },
    ],
  },
  {
    id: '1541i4o',
    symbol: 'Asi',
    meaning: 'One set of bars: number inside the window, legs across the plane, area of a bar, share developed',
    formula: 'n * legs * A * share',
    unit: 'mm2',
    families: ['bursting-thickness', 'bursting-plan', 'spalling'],
    clauses: [
      {
        source: 'Statics',
        section: 'legs that cross the plane inside its window',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: three links of 10 inside 44 to 220, two legs each: 471.2 mm²',
        test: 'tests/engine/steel-count.test.ts',
        name: 'cross with two legs each; the one at 30 stands before the window from 44',
      },
      {
        value: 'By hand: 225 of 300 past the line: 0.75 of the area; 119.9 counts nothing',
        test: 'tests/engine/steel-count.test.ts',
        name: '$length long: half of it past the line counts with $share',
      },
    ],
  },
  {
    id: '1nzre2t',
    symbol: 'AsCounted',
    meaning: 'Steel counted inside the window behind the bearing face',
    formula: 'As1 + … + Asn',
    unit: 'mm2',
    families: ['bursting-thickness', 'bursting-plan', 'spalling', 'pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'legs that cross the plane inside its window',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
      {
        source: 'Statics',
        section: 'bars that cross the line, developed on both sides',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: three links of 10 inside 44 to 220, two legs each: 471.2 mm²',
        test: 'tests/engine/steel-count.test.ts',
        name: 'cross with two legs each; the one at 30 stands before the window from 44',
      },
      {
        value: 'By hand: bars of 16, 300 of 421.5 past the face: 0.71 of the area; 264 counts nothing',
        test: 'tests/engine/pan-bars.test.ts',
        name: '$past past the bearing face on each side counts with $share',
      },
    ],
  },
  {
    id: '15f5676',
    symbol: 'Pjack',
    meaning: 'Forces of anchors that act as one, together',
    formula: 'P1 + … + Pn',
    unit: 'N',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'Statics',
        section: 'sum of forces',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: two anchors, 0.25 × 2 F (5000 - 620) / 5000',
        test: 'tests/engine/groups.test.ts',
        name: 'its prism runs to the middle of the outer gaps',
      },
    ],
  },
  {
    id: 'tz7ikv',
    symbol: 'b',
    meaning: 'Own prism: twice the nearer face',
    formula: '2 * min(cTop, cSoffit)',
    unit: 'mm',
    families: ['bursting-thickness'],
    clauses: [
      {
        source: 'Statics',
        section: 'symmetric prism',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: height 90 in 220: own prism 180, 327.1 mm²; mid-thickness 220, 374.7 mm²',
        test: 'tests/engine/bursting.test.ts',
        name: 'off centre the mid-thickness value is taken, and the own prism is said beside it',
      },
    ],
  },
  {
    id: 'kqnlct',
    symbol: 'b',
    meaning: 'Prism at mid-thickness',
    formula: 'top - soffit',
    unit: 'mm',
    families: ['bursting-thickness'],
    clauses: [
      {
        source: 'Statics',
        section: 'symmetric prism',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: height 90 in 220: own prism 180, 327.1 mm²; mid-thickness 220, 374.7 mm²',
        test: 'tests/engine/bursting.test.ts',
        name: 'off centre the mid-thickness value is taken, and the own prism is said beside it',
      },
    ],
  },
  {
    id: 'pap03k',
    symbol: 'sigmaP',
    meaning: 'Stress of the strand at the end of a stage',
    formula: 'share * Pjack / (n * Ap)',
    unit: 'MPa',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'Statics',
        section: 'force over area',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 588.8 kN / (4 × 98.7) = 1491.4 MPa; 818.5 + 220 = 1038.5 mm',
        test: 'tests/engine/dead-end.test.ts',
        name: 'steel counts from the bulbs over the lower transmission length (from memory) and one prism',
      },
    ],
  },
  {
    id: '1mp6ngs',
    symbol: 'fctd',
    meaning: 'Design tensile strength at stressing',
    formula: 'alphaCt * 0.7 * fctm / gammaC',
    unit: 'MPa',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: 'Table 3.1, 3.1.6(2)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX21 (from memory): 15.2 mm strand, 1300 MPa, fck(t) 25: 980, 784 and 1176 mm',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176',
      },
    ],
  },
  {
    id: '1w6w3uz',
    symbol: 'fbpt',
    meaning: 'Bond stress of the strand',
    formula: 'etaP1 * eta1 * fctd',
    unit: 'MPa',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.2.2(1) Eq. 8.15',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX21 (from memory): 15.2 mm strand, 1300 MPa, fck(t) 25: 980, 784 and 1176 mm',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176',
      },
    ],
  },
  {
    id: 'zq3lyy',
    symbol: 'lpt',
    meaning: 'Transmission length, strand released gradually',
    formula: 'alpha1 * alpha2 * d * sigmaPm0 / fbpt',
    unit: 'mm',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.2.2(2) Eq. 8.16',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX21 (from memory): 15.2 mm strand, 1300 MPa, fck(t) 25: 980, 784 and 1176 mm',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176',
      },
    ],
  },
  {
    id: 'mzddy5',
    symbol: 'lpt1',
    meaning: 'Lower value',
    formula: '0.8 * lpt',
    unit: 'mm',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.2.2(2) Eq. 8.16',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX21 (from memory): 15.2 mm strand, 1300 MPa, fck(t) 25: 980, 784 and 1176 mm',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176',
      },
    ],
  },
  {
    id: '1woccad',
    symbol: 'lpt2',
    meaning: 'Upper value',
    formula: '1.2 * lpt',
    unit: 'mm',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.2.2(2) Eq. 8.16',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX21 (from memory): 15.2 mm strand, 1300 MPa, fck(t) 25: 980, 784 and 1176 mm',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176',
      },
    ],
  },
  {
    id: 'me58ar',
    symbol: 'xTo',
    meaning: 'Behind the bulbs steel counts as far as the lower transmission length and one prism',
    formula: 'lower + b',
    unit: 'mm',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.2.2(2) Eq. 8.16',
        tag: 'memory',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '13.3.2',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 588.8 kN / (4 × 98.7) = 1491.4 MPa; 818.5 + 220 = 1038.5 mm',
        test: 'tests/engine/dead-end.test.ts',
        name: 'steel counts from the bulbs over the lower transmission length (from memory) and one prism',
      },
    ],
  },
  {
    id: '15mvhft',
    symbol: 'As',
    meaning: 'Steel asked for',
    formula: 'T / sigmaS',
    unit: 'mm2',
    families: ['bursting-thickness', 'bursting-plan', 'spalling'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.3(4)',
        tag: 'memory',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '12.5.6',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX17 (digest): P 800 kN, slab 200, plate 75: F 960 kN, T 150 kN, 500 mm² at 300 MPa',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'thickness: plate 75 in a 200 slab',
      },
      {
        value: 'EX15 (digest): 1000 kN, 150 from the face, plate 165: kr 0.55, T 112.5 kN, 750 mm² at 150 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
      },
    ],
  },
  {
    id: '15l4sqo',
    symbol: 'zc',
    meaning: 'Distance in height below which two anchors act as one',
    formula: '0.3 * D',
    unit: 'mm',
    families: ['bursting-thickness'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.5.3',
        tag: 'digest',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): section 700: 210, both sides',
        test: 'tests/engine/close-anchors.test.ts',
        name: '$apart apart in a section 700 deep',
      },
    ],
  },
  {
    id: 'lbg3u5',
    symbol: 'kr',
    meaning: 'Plate over prism',
    formula: 'a / D',
    unit: '-',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.5.4',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX15 (digest): 1000 kN, 150 from the face, plate 165: kr 0.55, T 112.5 kN, 750 mm² at 150 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
      },
    ],
  },
  {
    id: '127vafw',
    symbol: 'T',
    meaning: 'Bursting force',
    formula: '0.25 * kP * P * (1 - kr)',
    unit: 'N',
    families: ['bursting-thickness', 'bursting-plan'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.5.4',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX15 (digest): 1000 kN, 150 from the face, plate 165: kr 0.55, T 112.5 kN, 750 mm² at 150 MPa',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
      },
      {
        value: 'EX07 (textbook, from memory): 3000 kN, plate 315 in 1000: 513.75 kN, 3425 mm²',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX07 in the depth: 513.75 kN, 3425 mm2, counted from 200 to 1000',
      },
    ],
  },
  {
    id: 'bmer3m',
    symbol: 'Lpt',
    meaning: 'Transmission length of strand; the clause has one value, without bounds',
    formula: '60 * db',
    unit: 'mm',
    families: ['bursting-thickness', 'bursting-plan', 'dead-end'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.3.2',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (rule from memory): 15.2 mm strand: 912 mm',
        test: 'tests/published/as-3600.test.ts',
        name: '60 diameters: 15.2 mm strand 912 mm, whatever stress and strength, without bounds',
      },
    ],
  },
  {
    id: '1ghnuv0',
    symbol: 'b',
    meaning: 'Prism: twice the nearer half-gap or end of the edge',
    formula: '2 * min(before, after)',
    unit: 'mm',
    families: ['bursting-plan'],
    clauses: [
      {
        source: 'Statics',
        section: 'symmetric prism',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: half-gaps 675 and 1075: b 1350',
        test: 'tests/engine/bursting.test.ts',
        name: 'the nearer half-gap sets the prism, and a wide gap beside it is said',
      },
    ],
  },
  {
    id: '1rpblrb',
    symbol: 'Asi',
    meaning: 'A mat: spare share, bar area over spacing, length of the window, direction',
    formula: 'spare * A / s * l * c * c',
    unit: 'mm2',
    families: ['bursting-plan', 'spalling'],
    clauses: [
      {
        source: 'Statics',
        section: 'legs that cross the plane inside its window',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 0.25 × 113.1 / 200 over 1400: 197.9 mm²',
        test: 'tests/engine/steel-count.test.ts',
        name: 'count with the spare share only, along the edge',
      },
    ],
  },
  {
    id: '10fpvoh',
    symbol: 'sc',
    meaning: 'Spacing below which two anchors act as one in plan',
    formula: 'max(2 * a, 0.3 * 2 * min(l1, l2))',
    unit: 'mm',
    families: ['bursting-plan'],
    clauses: [
      {
        source: 'Close anchors in plan',
        section: '2 a and 0.3 of the prism of the pair',
        tag: 'digest',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): plates 170: 340; far from others 0.3 × 2 × 900 = 540',
        test: 'tests/engine/close-anchors.test.ts',
        name: '0.3 of the prism governs where the pair stands far from others',
      },
    ],
  },
  {
    id: 'a9y83g',
    symbol: 'xFrom',
    meaning: 'Behind the bearing face steel counts from here',
    formula: '0.2 * b',
    unit: 'mm',
    families: ['bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.5.3, silent on length',
        tag: 'computed',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '12.5.6',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX15 (digest): prism 300: from 60 to 300',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
      },
      {
        value: 'By hand (reading, computed): prism 220: from 44 to 220, three of four links count',
        test: 'tests/engine/bursting.test.ts',
        name: 'plate 80 at mid-height of 220, 588.8 kN: the hardware links carry it',
      },
    ],
  },
  {
    id: 'lxo6r7',
    symbol: 'xTo',
    meaning: 'And as far as here',
    formula: 'b',
    unit: 'mm',
    families: ['bursting-plan'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '6.5.3, silent on length',
        tag: 'computed',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '12.5.6',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX15 (digest): prism 300: from 60 to 300',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
      },
      {
        value: 'By hand (reading, computed): prism 220: from 44 to 220, three of four links count',
        test: 'tests/engine/bursting.test.ts',
        name: 'plate 80 at mid-height of 220, 588.8 kN: the hardware links carry it',
      },
    ],
  },
  {
    id: 'cc2tg2',
    symbol: 'TEd',
    meaning: 'Force along the face, factored',
    formula: 'gammaP * T',
    unit: 'N',
    families: ['spalling'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '2.4.2.2(3)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 0.088 P factored at 300 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'a row asks for more: 0.088 P factored at 300 MPa',
      },
      {
        value: 'By hand: row at 1750, plates 220, 588.8 kN: 1.2 T / 300',
        test: 'tests/engine/spalling.test.ts',
        name: 'asks at full force for 1.2 T / 300 (EN 1992-1-1 8.10.3(4), from memory)',
      },
    ],
  },
  {
    id: '1dl5tlo',
    symbol: 'AsT',
    meaning: 'Steel for that force',
    formula: 'TEd / sigmaS',
    unit: 'mm2',
    families: ['spalling'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.3(4)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 0.088 P factored at 300 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'a row asks for more: 0.088 P factored at 300 MPa',
      },
      {
        value: 'By hand: row at 1750, plates 220, 588.8 kN: 1.2 T / 300',
        test: 'tests/engine/spalling.test.ts',
        name: 'asks at full force for 1.2 T / 300 (EN 1992-1-1 8.10.3(4), from memory)',
      },
    ],
  },
  {
    id: '1qakoyi',
    symbol: 'Asurf',
    meaning: 'Least steel at a loaded face in each direction',
    formula: '0.03 * P * gammaP / (fyk / gammaS)',
    unit: 'mm2',
    families: ['spalling'],
    clauses: [
      {
        source: 'EN 1992-2:2005',
        section: 'J.104.2',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'Published sheet (rule from memory): 2500 kN at 250 MPa: 360 mm²',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '2500 kN at 250 MPa: 360 mm2, as a published sheet has it',
      },
    ],
  },
  {
    id: '17807qa',
    symbol: 'As',
    meaning: 'Steel asked for at the face',
    formula: 'max(AsT, Asurf)',
    unit: 'mm2',
    families: ['spalling'],
    clauses: [
      {
        source: 'EN 1992-2:2005',
        section: 'J.104.2',
        tag: 'memory',
        bases: ['en-1992'],
      },
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.3(4)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 0.088 P factored at 300 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'a row asks for more: 0.088 P factored at 300 MPa',
      },
    ],
  },
  {
    id: '1cvg34c',
    symbol: 'xFace',
    meaning: 'Depth over which the face is in tension midway, where the sum is greatest',
    formula: 'r * s',
    unit: 'mm',
    families: ['spalling'],
    clauses: [
      {
        source: 'Elastic theory',
        section: 'endless row of equal anchors, exact series',
        tag: 'computed',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'Exact series, finite elements within 0.2 % (computed): a / s 0.1, 0.2, 0.3: 0.0880, 0.0860, 0.0827 P',
        test: 'tests/published/row-series.test.ts',
        name: 'the steps hold the table and their text evaluates to them',
      },
      {
        value: 'By hand: row at 1750, plates 220, 588.8 kN: 1.2 T / 300',
        test: 'tests/engine/spalling.test.ts',
        name: 'asks at full force for 1.2 T / 300 (EN 1992-1-1 8.10.3(4), from memory)',
      },
    ],
  },
  {
    id: '3iy2r0',
    symbol: 'T',
    meaning: 'Force along the face midway between the anchors, all stressed',
    formula: '2 * P * xFace / (pi * a) * atan(sin(pi * a / s) / (exp(2 * pi * xFace / s) + cos(pi * a / s)))',
    unit: 'N',
    families: ['spalling'],
    clauses: [
      {
        source: 'Elastic theory',
        section: 'endless row of equal anchors, exact series',
        tag: 'computed',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'Exact series, finite elements within 0.2 % (computed): a / s 0.1, 0.2, 0.3: 0.0880, 0.0860, 0.0827 P',
        test: 'tests/published/row-series.test.ts',
        name: 'the steps hold the table and their text evaluates to them',
      },
    ],
  },
  {
    id: 'n76xf1',
    symbol: 'Tf',
    meaning: 'Force along the loaded face',
    formula: 'kP * T',
    unit: 'N',
    families: ['spalling'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.5.5',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX15 (digest): 100 kNm over 0.6 × 700: 238.1 kN, 1587 mm²',
        test: 'tests/published/as-3600.test.ts',
        name: 'EX15-L1 at the face: 100 kNm over 0.6 * 700 is 238.1 kN, 1587 mm2',
      },
    ],
  },
  {
    id: '2zng74',
    symbol: 'ct',
    meaning: 'Centre of the anchor below top',
    formula: 'zt - z',
    unit: 'mm',
    families: ['cover'],
    clauses: [
      {
        source: 'Hardware or its approval',
        section: 'smallest distances',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 220 - 145 = 75',
        test: 'tests/engine/cover.test.ts',
        name: '$height is $status below a top at 220',
      },
    ],
  },
  {
    id: 'pns4fs',
    symbol: 'c',
    meaning: 'Plate or pocket below top',
    formula: 'zt - z - h / 2',
    unit: 'mm',
    families: ['cover'],
    clauses: [
      {
        source: 'Job setting',
        section: 'accepted with the basis',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
      {
        source: 'Nominal cover of the pour or region',
        section: 'as entered',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: the mirror of plate and pocket at the soffit',
        test: 'tests/engine/cover.test.ts',
        name: 'upside down gives the same against the top',
      },
    ],
  },
  {
    id: '9q45iz',
    symbol: 'c',
    meaning: 'Plate or pocket above soffit',
    formula: 'z - h / 2 - zs',
    unit: 'mm',
    families: ['cover'],
    clauses: [
      {
        source: 'Job setting',
        section: 'accepted with the basis',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
      {
        source: 'Nominal cover of the pour or region',
        section: 'as entered',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: plate of 80 at 70: 30; pocket of 120 at 55: -5',
        test: 'tests/engine/cover.test.ts',
        name: 'pocket centred $height above the soffit is $status',
      },
    ],
  },
  {
    id: '1ob0de8',
    symbol: 'cs',
    meaning: 'Centre of the anchor above soffit',
    formula: 'z - zs',
    unit: 'mm',
    families: ['cover'],
    clauses: [
      {
        source: 'Hardware or its approval',
        section: 'smallest distances',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 55 above the soffit, 75 asked for: short by 20',
        test: 'tests/engine/cover.test.ts',
        name: 'short by 20 at 55, and the height that mends it',
      },
    ],
  },
  {
    id: '649bic',
    symbol: 'c',
    meaning: 'Plate above the floor of the recess',
    formula: 'z - h / 2 - zf',
    unit: 'mm',
    families: ['cover'],
    clauses: [
      {
        source: 'Hardware or its approval',
        section: 'plate',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: slab 220, plate 80 at 110, recess 150 deep: 0',
        test: 'tests/engine/cover.test.ts',
        name: 'recess $depth deep: $demand from plate to floor is $status',
      },
    ],
  },
  {
    id: 'ydh7f0',
    symbol: 's',
    meaning: 'Distance between two anchors along the edge or in height, or to the end of the edge',
    formula: 'abs(x2 - x1)',
    unit: 'mm',
    families: ['spacing'],
    clauses: [
      {
        source: 'Hardware or its approval',
        section: 'smallest distances',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: on both sides of 350, from either side',
        test: 'tests/engine/spacing.test.ts',
        name: '$spacing apart is $status, from either side',
      },
    ],
  },
  {
    id: 'wytqyc',
    symbol: 'd',
    meaning: 'Depth of the edge wedge at the end of the edge: set-back and spread from one plate',
    formula: 'e + max(0, s - a / 2) / t',
    unit: 'mm',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'Geometry of spread',
        section: 'closed form',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: end of the edge 900 away: 110 + 790 = 900; 110 + 790 × 1.5 = 1295',
        test: 'tests/engine/wedge/closed-form.test.ts',
        name: 'the end of the edge: set-back and the clear distance from the plate',
      },
    ],
  },
  {
    id: '5xze3y',
    symbol: 'fctEff',
    meaning: 'Tensile strength when cracks are expected: the 28-day mean, or the job’s own',
    formula: 'fctm',
    unit: 'MPa',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: 'Table 3.1',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: slab 220, cover 30, 12 mm bars, 0.3 mm: 249.3 MPa, 2668 mm²/m',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m',
      },
    ],
  },
  {
    id: '1n9ri9w',
    symbol: 'phiS',
    meaning: 'Bar size at which the table is read',
    formula: 'd / (fctEff / 2.9 * h / (8 * (c + d / 2)))',
    unit: 'mm',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.3(2) Eq. 7.7N',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: slab 220, cover 30, 12 mm bars, 0.3 mm: 249.3 MPa, 2668 mm²/m',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m',
      },
    ],
  },
  {
    id: '1j2o588',
    symbol: 'sigmaT',
    meaning: 'Stress of the table, between its rows',
    formula: 's1 + (s2 - s1) * (phiS - d1) / (d2 - d1)',
    unit: 'MPa',
    families: ['edge-wedge', 'joint'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.3(2) Table 7.2N',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: slab 220, cover 30, 12 mm bars, 0.3 mm: 249.3 MPa, 2668 mm²/m',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m',
      },
    ],
  },
  {
    id: '1mmxh1q',
    symbol: 'sigmaS',
    meaning: 'Steel stress, not above yield',
    formula: 'min(sigmaT, fyk)',
    unit: 'MPa',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.2(2) Eq. 7.1',
        tag: 'read',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 800 thick, 8 mm bars, fyk 250: 250 in place of 450 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'the stress never exceeds the yield strength',
      },
    ],
  },
  {
    id: '1qp0a7w',
    symbol: 'k',
    meaning: 'Share for self-stress: 1.0 to 300 thick, 0.65 from 800',
    formula: 'max(0.65, min(1, 1 - 0.35 * (h - 300) / 500))',
    unit: '-',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.2(2) Eq. 7.1',
        tag: 'read',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By proportion: 1.0 at 300 thick, 0.825 at 550, 0.65 from 800',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'self-stress: k is 1.0 up to 300 thick, 0.825 at 550, 0.65 from 800',
      },
    ],
  },
  {
    id: '18b40x3',
    symbol: 'AsCrack',
    meaning: 'Least steel per metre, both faces together',
    formula: 'kc * k * fctEff * 1000 * h / sigmaS',
    unit: 'mm2/m',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.2(2) Eq. 7.1',
        tag: 'read',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: slab 220, cover 30, 12 mm bars, 0.3 mm: 249.3 MPa, 2668 mm²/m',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m',
      },
      {
        value: 'C04 (read, table from memory): 280 MPa, 220 thick: 2376 mm²/m',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'C04: at 280 MPa, that is 12 mm read in the table, 2376 mm2/m',
      },
    ],
  },
  {
    id: 'c7f8q9',
    symbol: 'AsMat',
    meaning: 'Spare share of the mats across the edge, both faces together',
    formula: 'm1 + … + mn',
    unit: 'mm2/m',
    families: ['edge-wedge', 'joint'],
    clauses: [
      {
        source: 'Geometry of bars',
        section: 'areas across the edge',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 12 at 200, half spare: 282.7 mm²/m; at 30°, cos² = 0.75: 212.1',
        test: 'tests/engine/edge-wedge.test.ts',
        name: 'the spare share of a mat counts where it runs across, and only that',
      },
    ],
  },
  {
    id: 'hrenzz',
    symbol: 'AsAcross',
    meaning: 'Steel across, both faces together',
    formula: 'As1 + … + Asn + AsMat',
    unit: 'mm2/m',
    families: ['edge-wedge', 'joint'],
    clauses: [
      {
        source: 'Geometry of bars',
        section: 'areas across the edge',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 22 bars of 12 in both layers in 1.75 m: 22 × 129.254 mm²/m',
        test: 'tests/engine/edge-wedge.test.ts',
        name: '$count bars in both layers: $status',
      },
    ],
  },
  {
    id: '6a90u7',
    symbol: 'd',
    meaning: 'Depth of the edge wedge between two plates from the slab edge',
    formula: '(s - (a1 + a2) / 2 + e1 * t1 + e2 * t2) / (t1 + t2)',
    unit: 'mm',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'Geometry of spread',
        section: 'closed form',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'Z05 (derived): plates 220 at 1750: 765 at 45°, 1147.5 at arctan(2/3)',
        test: 'tests/engine/wedge/closed-form.test.ts',
        name: '1750 apart, plates 220',
      },
    ],
  },
  {
    id: 'g0kxx7',
    symbol: 'share',
    meaning: 'Share that counts: length past the strip without precompression over the length needed',
    formula: 'max(0, min(1, lPast / lNeed))',
    unit: '-',
    families: ['edge-wedge', 'joint'],
    clauses: [
      {
        source: 'Common practice',
        section: 'bars reach past the wedge by their anchorage',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: apex 1147.5, 410.8 needed: 1529 long counts in full, 205.4 less for half',
        test: 'tests/engine/edge-wedge.test.ts',
        name: 'bars of $length count for $share',
      },
    ],
  },
  {
    id: '6eay8p',
    symbol: 'Asi',
    meaning: 'One set of wedge bars, for each metre of the edge',
    formula: 'share * n * Abar * 1000 / w',
    unit: 'mm2/m',
    families: ['edge-wedge', 'joint'],
    clauses: [
      {
        source: 'Geometry of bars',
        section: 'areas across the edge',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 22 bars of 12 in both layers in 1.75 m: 22 × 129.254 mm²/m',
        test: 'tests/engine/edge-wedge.test.ts',
        name: '$count bars in both layers: $status',
      },
    ],
  },
  {
    id: '14zcn6h',
    symbol: 'd',
    meaning: 'Depth of the edge wedge where two spreads meet, from the slab edge',
    formula: '(c2 - c1 + e1 * t1 + e2 * t2) / (t1 + t2)',
    unit: 'mm',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'Geometry of spread',
        section: 'outline of the spreads',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: plates at 4000 and 8000 with pans between: from 4110 and 7890 at 45° to 1890 at 6000',
        test: 'tests/engine/wedge/areas.test.ts',
        name: 'behind two pans the spread of the edge’s own anchors comes first',
      },
    ],
  },
  {
    id: '1u7txub',
    symbol: 'sigmaT',
    meaning: 'Beyond the largest bar of the table, in proportion',
    formula: 's * d / phiS',
    unit: 'MPa',
    families: ['edge-wedge', 'pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.4(1), by proportion',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: phi 215.3: 160 × 32 / 215.3 = 23.8 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'beyond the last row the stress goes on falling, never below it by a jump',
      },
    ],
  },
  {
    id: 'qedvk2',
    symbol: 'd',
    meaning: 'Depth of the edge wedge on the line of one spread, from the slab edge',
    formula: 'e + abs(x - c) / t',
    unit: 'mm',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'Geometry of spread',
        section: 'outline of the spreads',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 8490 - 4110 at 45°: 4380',
        test: 'tests/engine/wedge/areas.test.ts',
        name: 'a tendon that stops short in a pan compresses only between its two ends',
      },
    ],
  },
  {
    id: '4nkhlv',
    symbol: 'd',
    meaning: 'Depth of the strip before the bearing faces where spreads overlap at the face',
    formula: 'e',
    unit: 'mm',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'Geometry of spread',
        section: 'closed form',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
      {
        source: 'Geometry of spread',
        section: 'outline of the spreads',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: plates of 220 at 150, set back 110: 110',
        test: 'tests/engine/wedge/closed-form.test.ts',
        name: 'plates that overlap leave the strip before the bearing faces',
      },
    ],
  },
  {
    id: '1tftm2u',
    symbol: 'sigmaT02',
    meaning: 'Stress of the table, between its rows',
    formula: 's1 + (s2 - s1) * (phiS - d1) / (d2 - d1)',
    unit: 'MPa',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.3(2) Table 7.2N',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: slab 220, cover 30, 12 mm bars, 0.3 mm: 249.3 MPa, 2668 mm²/m',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: '220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m',
      },
    ],
  },
  {
    id: 'rco9b4',
    symbol: 'sigmaT',
    meaning: 'Stress for a width below 0.2, in proportion (on the safe side: Eq. 7.8 falls faster)',
    formula: 'sigmaT02 * w / 0.2',
    unit: 'MPa',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.4(1), by proportion',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By proportion: half the stress of 0.2 mm at 0.1 mm',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'one step less: 0.3 gives what 0.2 gives; 0.2 asks for twice its own, 0.1 for half of a width of 0.1',
      },
    ],
  },
  {
    id: '1tawig2',
    symbol: 'sigmaT',
    meaning: 'Highest stress of the table',
    formula: 's',
    unit: 'MPa',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.3(2) Table 7.2N',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 800 thick, 8 mm bars, fyk 250: 250 in place of 450 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'the stress never exceeds the yield strength',
      },
    ],
  },
  {
    id: 'lowkzz',
    symbol: 'beta',
    meaning: 'Angle of spread behind an anchor',
    formula: 'atan(2 / 3)',
    unit: 'rad',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.10.3(5)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX17 (from memory): plate 75 in 200: 93.75 mm; 220 at 1000: 585 mm',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'spread at arctan(2/3): 93.75 mm in the thickness, 585 mm in plan',
      },
    ],
  },
  {
    id: '18da03q',
    symbol: 'D',
    meaning: 'Thickness that counts: 250 at each face at most',
    formula: 'min(h, 500)',
    unit: 'mm',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '9.5.3.4',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'C01 to C03 (secondary): 220 thick: 385, 770 and 1320 mm²/m; strong with 1.2 MPa counted 660',
        test: 'tests/published/as-3600.test.ts',
        name: 'C01 minor 385, C02 moderate 770, strong 1320 mm2/m in a 220 slab',
      },
      {
        value: 'By hand: over 500 thick 250 at each face counts',
        test: 'tests/published/as-3600.test.ts',
        name: 'over 500 thick only the outer 250 at each face counts',
      },
    ],
  },
  {
    id: '1n3mz5r',
    symbol: 'AsCrack',
    meaning: 'Least steel per metre, both faces together',
    formula: 'max(0, c - 2.5 * sigmaCp) * 1000 * D / 1000',
    unit: 'mm2/m',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '9.5.3.4',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'C01 to C03 (secondary): 220 thick: 385, 770 and 1320 mm²/m; strong with 1.2 MPa counted 660',
        test: 'tests/published/as-3600.test.ts',
        name: 'C01 minor 385, C02 moderate 770, strong 1320 mm2/m in a 220 slab',
      },
    ],
  },
  {
    id: '2xeniu',
    symbol: 'sMax',
    meaning: 'Largest spacing of the bars',
    formula: 'min(1.5 * h, 200)',
    unit: 'mm',
    families: ['edge-wedge', 'joint', 'pan-bars'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '9.5.3',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (secondary): 200 at most, 1.5 of a slab thinner than 133.3',
        test: 'tests/published/as-3600.test.ts',
        name: 'spacing: 200 at most, in a slab thinner than 133.3 no more than 1.5 of it',
      },
    ],
  },
  {
    id: '1ro1tow',
    symbol: 'beta',
    meaning: 'Angle of spread behind an anchor',
    formula: 'atan(1)',
    unit: 'rad',
    families: ['edge-wedge'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '12.5, 1 in 1 for the steel of the zone',
        tag: 'digest',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): 1 in 1: tan of the angle is 1',
        test: 'tests/published/as-3600.test.ts',
        name: 'force spreads at 1 in 1 (12.5, digest)',
      },
    ],
  },
  {
    id: 'fyzhhb',
    symbol: 'l0',
    meaning: 'Lap of two bars',
    formula: 'lap',
    unit: 'mm',
    families: ['joint', 'anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.7.3',
        tag: 'memory',
        bases: ['en-1992'],
      },
      {
        source: 'Geometry of bars',
        section: 'areas across the joint',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
      {
        source: 'AS 3600:2018',
        section: '13.2.2',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (laps from memory): 700 each side, lap 616.2: 1400 and 2632',
        test: 'tests/engine/joint.test.ts',
        name: 'each side 110 + (1400 - 220) / 2 = 700: 1400 together, with a lap on both sides',
      },
      {
        value: 'E01 to E07 (digest, Table 8.2 from memory): 12 mm in 32 MPa: 410.8, 318.4 and a lap of 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
      {
        value: 'AS 3600 13.1 and 13.2 (secondary): development and laps of seven bars',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1e5pl1l',
    symbol: 'T',
    meaning: 'Tie behind the anchor, unfactored',
    formula: '0.25 * P',
    unit: 'N',
    families: ['joint', 'pan-bars'],
    clauses: [
      {
        source: 'AASHTO LRFD',
        section: 'intermediate anchors, without credit for compression',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (share from memory): 588.8 kN: 147.2 kN, 491 mm² at 300 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'a quarter of 588.8 kN at 0.6 of 500 MPa: 147.2 kN, 491 mm2',
      },
    ],
  },
  {
    id: 'rrj6ti',
    symbol: 'sigmaT',
    meaning: 'Steel stress: 0.6 of the yield strength',
    formula: '0.6 * fy',
    unit: 'MPa',
    families: ['joint', 'pan-bars'],
    clauses: [
      {
        source: 'AASHTO LRFD',
        section: 'intermediate anchors, without credit for compression',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (share from memory): 588.8 kN: 147.2 kN, 491 mm² at 300 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'a quarter of 588.8 kN at 0.6 of 500 MPa: 147.2 kN, 491 mm2',
      },
    ],
  },
  {
    id: '15wv34s',
    symbol: 'As',
    meaning: 'Steel asked for behind the anchor',
    formula: 'T / sigmaT',
    unit: 'mm2',
    families: ['joint', 'pan-bars'],
    clauses: [
      {
        source: 'AASHTO LRFD',
        section: 'intermediate anchors, without credit for compression',
        tag: 'memory',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (share from memory): 588.8 kN: 147.2 kN, 491 mm² at 300 MPa',
        test: 'tests/published/en-1992-edge-rules.test.ts',
        name: 'a quarter of 588.8 kN at 0.6 of 500 MPa: 147.2 kN, 491 mm2',
      },
    ],
  },
  {
    id: 'qb8mej',
    symbol: 'AsTie',
    meaning: 'Bars across between half the gaps beside the anchor',
    formula: 'AsAcross * b / 1000',
    unit: 'mm2',
    families: ['joint'],
    clauses: [
      {
        source: 'Geometry of bars',
        section: 'areas across the joint',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 70 bars of 12 between half the gaps',
        test: 'tests/engine/joint.test.ts',
        name: 'bars between half the gaps beside the anchor count where they are developed past its bearing face',
      },
    ],
  },
  {
    id: '1eq6e5',
    symbol: 'w',
    meaning: 'Width of the strip without precompression, both sides',
    formula: 'd1 + d2',
    unit: 'mm',
    families: ['joint'],
    clauses: [
      {
        source: 'Geometry of spread',
        section: 'both sides of a joint',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (laps from memory): 700 each side, lap 616.2: 1400 and 2632',
        test: 'tests/engine/joint.test.ts',
        name: 'each side 110 + (1400 - 220) / 2 = 700: 1400 together, with a lap on both sides',
      },
    ],
  },
  {
    id: '1parje1',
    symbol: 'lBar',
    meaning: 'Length of a bar across, its middle at the joint',
    formula: '2 * (max(d1, d2) + l0)',
    unit: 'mm',
    families: ['joint'],
    clauses: [
      {
        source: 'Geometry of bars',
        section: 'areas across the joint',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (laps from memory): 700 each side, lap 616.2: 1400 and 2632',
        test: 'tests/engine/joint.test.ts',
        name: 'each side 110 + (1400 - 220) / 2 = 700: 1400 together, with a lap on both sides',
      },
    ],
  },
  {
    id: '1m9t0s3',
    symbol: 'Lj',
    meaning: 'Length that the jack needs: closed, stroke, strand tail, hand room',
    formula: 'Lc + st + tl + hr',
    unit: 'mm',
    families: ['pan-access'],
    clauses: [
      {
        source: 'Jack of the job',
        section: 'as entered',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 620 + 200 + 150 + 230 = 1200, 1 mm on both sides',
        test: 'tests/engine/pan-access.test.ts',
        name: '$clear in front of a jack of 1200 is $status',
      },
    ],
  },
  {
    id: '1sxk9ce',
    symbol: 'La',
    meaning: 'Room from the bearing face along the axis of the tendon',
    formula: '(jc + sb) / cos(sk) / cos(el)',
    unit: 'mm',
    families: ['pan-access'],
    clauses: [
      {
        source: 'Geometry',
        section: 'recess against concrete and openings',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 1090 + 110 = 1200, 1 mm on both sides',
        test: 'tests/engine/pan-access.test.ts',
        name: '$jackClear in front of the edge: $status',
      },
    ],
  },
  {
    id: 'encvou',
    symbol: 'g',
    meaning: 'Clear height under the jack, at its front and at the bearing face',
    formula: 'z + x * tan(t) - d / 2 / cos(t) - (zt - dp + dp * x / lp)',
    unit: 'mm',
    families: ['pan-access'],
    clauses: [
      {
        source: 'Jack of the job',
        section: 'as entered',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: tilted 20°, nose 60: recess 143 deep leaves 1.075',
        test: 'tests/engine/pan-access.test.ts',
        name: 'recess $depth deep: $status',
      },
    ],
  },
  {
    id: '15bbfoi',
    symbol: 'gs',
    meaning: 'Clear on each side of the jack',
    formula: '(w - d) / 2',
    unit: 'mm',
    families: ['pan-access'],
    clauses: [
      {
        source: 'Jack of the job',
        section: 'as entered',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 190 wide, body 90: 50 on each side',
        test: 'tests/engine/pan-access.test.ts',
        name: 'recess $across wide, 90 and twice 50 asked for: $status',
      },
    ],
  },
  {
    id: '3gz4xo',
    symbol: 'La',
    meaning: 'Room along the axis of the jack',
    formula: 'Lp / cos(t)',
    unit: 'mm',
    families: ['pan-access'],
    clauses: [
      {
        source: 'Geometry',
        section: 'along the tilted axis',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 1170 / cos 15° = 1211.3',
        test: 'tests/engine/pan-access.test.ts',
        name: 'a tilted axis is longer than its plan: 1170 / cos 15 = 1211.3',
      },
    ],
  },
  {
    id: '1pqsxl3',
    symbol: 'Hn',
    meaning: 'Height above the slab that the jack needs',
    formula: 'z + (Lc + st) * sin(t) + d / 2 * cos(t) - zt + ha',
    unit: 'mm',
    families: ['pan-access'],
    clauses: [
      {
        source: 'Jack of the job',
        section: 'as entered',
        tag: 'read',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 110 + 45 - 220 + 600 = 535',
        test: 'tests/engine/pan-access.test.ts',
        name: '$headroom clear above the slab: $status',
      },
    ],
  },
  {
    id: 'vb58h7',
    symbol: 'AsF',
    meaning: 'Bars of both faces for the force of the tendon',
    formula: 'n * Fp01k / fyk',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'bars for the force and the moment of the tendon that stops short',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 4 × 165.5 / 500 = 1324 mm²; × 110 / 170 = 856.7 mm² in each face',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'bars for the force and the moment of the tendon (derived)',
      },
    ],
  },
  {
    id: 'zbmhgt',
    symbol: 'AsM',
    meaning: 'Bars at one face for the moment of the tendon that stops short',
    formula: 'AsF * dp / (h - c - phi)',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'bars for the force and the moment of the tendon that stops short',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 4 × 165.5 / 500 = 1324 mm²; × 110 / 170 = 856.7 mm² in each face',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'bars for the force and the moment of the tendon (derived)',
      },
    ],
  },
  {
    id: 'vpp9nc',
    symbol: 'AsC',
    meaning: 'Crack steel of the strip, both faces',
    formula: 'am * w / 1000',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '7.3.2(2) Eq. 7.1',
        tag: 'read',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '9.5.3.4',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (table from memory): 3627 mm²/m over 1.8 m and two faces: 3264 mm²',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'the crack steel that the job chose counts over the width of the strip (EN 7.3.2; table from memory)',
      },
    ],
  },
  {
    id: 'xvev45',
    symbol: 'As',
    meaning: 'Bars asked for at one face of the strip',
    formula: 'max(AsM, AsF / 2, AsC / 2)',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'bars for the force and the moment of the tendon that stops short',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 4 × 165.5 / 500 = 1324 mm²; × 110 / 170 = 856.7 mm² in each face',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'bars for the force and the moment of the tendon (derived)',
      },
    ],
  },
  {
    id: '10h2gvw',
    symbol: 'Ncuti',
    meaning: 'Bars of a mat cut by the recess: whole spacings, and one',
    formula: 'm + 1',
    unit: '',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Common practice',
        section: 'bars cut by a recess, worst position of the mat',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 940 + 2 × 30 at 200: six bars, 939 five',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'recess $along long: $bars bars across it',
      },
    ],
  },
  {
    id: '1uyvh2u',
    symbol: 'Ni',
    meaning: 'Bars of a mat cut or within cover of the recess: whole spacings, and one',
    formula: 'm + 1',
    unit: '',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Common practice',
        section: 'bars cut by a recess, worst position of the mat',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 940 + 2 × 30 at 200: six bars, 939 five',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'recess $along long: $bars bars across it',
      },
    ],
  },
  {
    id: '1uth3fk',
    symbol: 'Acuti',
    meaning: 'Area of these bars',
    formula: 'Ni * A',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Common practice',
        section: 'bars cut by a recess, worst position of the mat',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 940 + 2 × 30 at 200: six bars, 939 five',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'recess $along long: $bars bars across it',
      },
    ],
  },
  {
    id: 'ospp7w',
    symbol: 'Acut',
    meaning: 'Area cut, to be replaced half on each side',
    formula: 'Acut1 + … + Acutn',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'area cut is area replaced',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 940 + 2 × 30 at 200: six bars, 939 five',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'recess $along long: $bars bars across it',
      },
    ],
  },
  {
    id: 'vcp71x',
    symbol: 'Asi',
    meaning: 'One set of bars across the line: number, area of a bar, share developed on both sides',
    formula: 'n * A * share',
    unit: 'mm2',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Statics',
        section: 'bars that cross the line, developed on both sides',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: bars of 16, 300 of 421.5 past the face: 0.71 of the area; 264 counts nothing',
        test: 'tests/engine/pan-bars.test.ts',
        name: '$past past the bearing face on each side counts with $share',
      },
    ],
  },
  {
    id: 'dsiw97',
    symbol: 'hr',
    meaning: 'Concrete under the recess',
    formula: 'zt - dp - zs',
    unit: 'mm',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Nominal cover of the pour or region',
        section: 'as entered',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 220 - 190 = 30, the cover',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'recess $depth deep in 220, cover 30: $status',
      },
    ],
  },
  {
    id: '14gfpkw',
    symbol: 'T',
    meaning: 'Tie behind the anchor, by the engineer',
    formula: 'Town',
    unit: 'N',
    families: ['pan-bars'],
    clauses: [
      {
        source: 'Engineer of the job',
        section: 'own tie force',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: own force 200 kN at 300 MPa: 666.7 mm²',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'the engineer’s own 200 kN at 300 MPa: 666.7 mm2, by a reading of its own, with its reason',
      },
    ],
  },
  {
    id: 'lyl4or',
    symbol: 'Pmax',
    meaning: 'Largest force of the tendon: the smaller share of breaking load and proof load',
    formula: 'n * min(kBreaking * Fpk, kProof * Fp01k)',
    unit: 'N',
    families: ['tendon'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '5.10.2.1(1)',
        tag: 'memory',
        bases: ['en-1992'],
      },
      {
        source: 'EN 1992-1-1:2004',
        section: '5.10.3(2)',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX19 (derived): fpk 1860, fp0.1k 1640: 1476 MPa, 885.6 kN in four strands of 150 mm²',
        test: 'tests/published/en-1992-anchors.test.ts',
        name: 'jacking: min(0.8 fpk, 0.9 fp0.1k) = 1476 MPa, 885.6 kN in four strands',
      },
    ],
  },
  {
    id: '63t600',
    symbol: 'q',
    meaning: 'Share of the force lost on the way to where draw-in ends',
    formula: 'sqrt(w * E * A * u / L / P0)',
    unit: '-',
    families: ['tendon'],
    clauses: [
      {
        source: 'Draw-in against friction',
        section: 'mirrored exponential diagram, even curvature',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX19 (derived): draw-in 6: 14.03 m, loss 100.1, after lock-off 785.5 kN',
        test: 'tests/published/friction.test.ts',
        name: 'draw-in by the exact form: 14.03 m, loss 100.1, after lock-off 785.5 kN',
      },
    ],
  },
  {
    id: 'bmcanm',
    symbol: 'lSet',
    meaning: 'Length over which draw-in is felt',
    formula: '(0 - log(1 - q)) * L / u',
    unit: 'mm',
    families: ['tendon'],
    clauses: [
      {
        source: 'Draw-in against friction',
        section: 'mirrored exponential diagram, even curvature',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX19 (derived): draw-in 6: 14.03 m, loss 100.1, after lock-off 785.5 kN',
        test: 'tests/published/friction.test.ts',
        name: 'draw-in by the exact form: 14.03 m, loss 100.1, after lock-off 785.5 kN',
      },
    ],
  },
  {
    id: 'mvez6s',
    symbol: 'Panchor',
    meaning: 'Force at the anchor after lock-off',
    formula: 'P0 * exp(0 - 2 * u * lSet / L)',
    unit: 'N',
    families: ['tendon'],
    clauses: [
      {
        source: 'Draw-in against friction',
        section: 'mirrored exponential diagram, even curvature',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'EX19 (derived): draw-in 6: 14.03 m, loss 100.1, after lock-off 785.5 kN',
        test: 'tests/published/friction.test.ts',
        name: 'draw-in by the exact form: 14.03 m, loss 100.1, after lock-off 785.5 kN',
      },
    ],
  },
  {
    id: '1e6cgoq',
    symbol: 'Panchor',
    meaning: 'Force at the anchor after lock-off; draw-in is felt as far as the other end',
    formula: '(P0 * (1 - exp(0 - u)) - w * E * A * u / L) / (exp(u) - 1)',
    unit: 'N',
    families: ['tendon'],
    clauses: [
      {
        source: 'Draw-in against friction',
        section: 'mirrored exponential diagram, even curvature',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: where draw-in just reaches the far end both forms give P0 e^-0.2',
        test: 'tests/engine/tendon.test.ts',
        name: 'just as long as the tendon: both forms give one force',
      },
    ],
  },
  {
    id: 'ufp6eu',
    symbol: 'dL',
    meaning: 'Elongation, n 1 from one end and 2 from both',
    formula: 'P0 * (1 - exp(0 - u / n)) / (u / n) * L / (E * A)',
    unit: 'mm',
    families: ['tendon'],
    clauses: [
      {
        source: 'Statics',
        section: 'strain summed along the tendon',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'EX19 (derived): 172.65 mm',
        test: 'tests/published/friction.test.ts',
        name: 'elongation 172.65 mm: 885,600 x (1 - e^-0.1026) / 0.1026 x 24,000 / (195,000 x 600)',
      },
    ],
  },
  {
    id: 'sd1dl4',
    symbol: 'Panchor',
    meaning: 'Force at the anchor after lock-off, without friction',
    formula: 'P0 - w * E * A / L',
    unit: 'N',
    families: ['tendon'],
    clauses: [
      {
        source: 'Draw-in against friction',
        section: 'mirrored exponential diagram, even curvature',
        tag: 'derived',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 588.8 - 461.916 / 17.18 = 561.9 kN',
        test: 'tests/engine/tendon.test.ts',
        name: 'without friction P0 - w E A / L: 588.8 - 461.916 / 17.18 = 561.9 kN is over',
      },
    ],
  },
  {
    id: 'qdmqig',
    symbol: 'dL',
    meaning: 'Elongation without friction',
    formula: 'P0 * L / (E * A)',
    unit: 'mm',
    families: ['tendon'],
    clauses: [
      {
        source: 'Statics',
        section: 'strain summed along the tendon',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 588.8 kN x 17,180 / (195,000 x 394.8) = 131.4 mm',
        test: 'tests/engine/tendon.test.ts',
        name: 'elongates without friction by P0 L / (E A): 588.8 x 17,180 / (195 x 394.8) = 131.4',
      },
    ],
  },
  {
    id: '29lwno',
    symbol: 'Pmax',
    meaning: 'Largest force of the tendon: a share of its breaking load',
    formula: 'n * kJacking * Fpb',
    unit: 'N',
    families: ['tendon'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '17.3.4.6',
        tag: 'memory',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (share from memory): 0.85 of the breaking load',
        test: 'tests/published/as-3600.test.ts',
        name: '0.85 of the breaking load, whatever the proof load; after lock-off there is no limit',
      },
    ],
  },
  {
    id: 'lli0eg',
    symbol: 'D',
    meaning: 'Depth that the steel and its covers take up',
    formula: 'h + ct + cs + 2 * dl',
    unit: 'mm',
    families: ['fit'],
    clauses: [
      {
        source: 'Nominal cover of the pour or region',
        section: 'as entered',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: spiral 160 + 30 + 30 = 220',
        test: 'tests/engine/fit.test.ts',
        name: 'spiral of $outside and two covers: $asked in 220 is $status',
      },
    ],
  },
  {
    id: '6hibc0',
    symbol: 'past',
    meaning: 'Overlap of two sets of edge bars',
    formula: 'to - from',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: overlap 614 against a lap of 613.1',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'two sets: 614 of overlap is enough, 613 is not',
      },
    ],
  },
  {
    id: '3ii4hf',
    symbol: 'past',
    meaning: 'Straight end of the hook past its bend',
    formula: 'hook - r - d',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 130 - 20 - 10 = 100',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'hooks of links of 10: 10 d = 100 straight past the bend (8.5, Fig. 8.5, from memory)',
      },
    ],
  },
  {
    id: '1obahx8',
    symbol: 'past',
    meaning: 'Straight leg past the bend',
    formula: 'leg - r - d',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: leg 334 - 20 - 10 = 304 against 303.3',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'legs of hairpins of 10: 2.5 x 300 / 2.4732 = 303.3 past r 20 and d 10',
      },
    ],
  },
  {
    id: '1qxm3v',
    symbol: 'lb',
    meaning: 'Basic length to develop the stress',
    formula: 'd / 4 * sigma / fb',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.4.2 to 8.4.4',
        tag: 'digest',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'E01 to E07 (digest, Table 8.2 from memory): 12 mm in 32 MPa: 410.8, 318.4 and a lap of 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
      {
        value: 'AS 3600 13.1 and 13.2 (secondary): development and laps of seven bars',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1m4kikr',
    symbol: 'lmin',
    meaning: 'Least length that counts',
    formula: 'least',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.4.2 to 8.4.4',
        tag: 'digest',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'E01 to E07 (digest, Table 8.2 from memory): 12 mm in 32 MPa: 410.8, 318.4 and a lap of 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1751wmi',
    symbol: 'ld',
    meaning: 'Length that develops it in full; k by cover and bend',
    formula: 'k * max(lb, lmin)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.4.2 to 8.4.4',
        tag: 'digest',
        bases: ['en-1992'],
      },
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'E01 to E07 (digest, Table 8.2 from memory): 12 mm in 32 MPa: 410.8, 318.4 and a lap of 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
      {
        value: 'AS 3600 13.1 and 13.2 (secondary): development and laps of seven bars',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1w8s302',
    symbol: 'past',
    meaning: 'Shorter end of a bar past the line that it crosses',
    formula: 'l',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: bar of 240: 120 past the line, the least that counts',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'transverse bars count from 120 past the line on, and not 1 mm below',
      },
    ],
  },
  {
    id: 'cey8ke',
    symbol: 'past',
    meaning: 'Wedge bars past the deepest place of the wedge',
    formula: 'cover + l - depth',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 30 + 1529 - 1147.5 = 411.5 past the apex',
        test: 'tests/engine/edge-wedge.test.ts',
        name: 'bars of $length count for $share',
      },
    ],
  },
  {
    id: 'nvr9w0',
    symbol: 'past',
    meaning: 'Trimmers past each end of the recess',
    formula: '(l - recess) / 2',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: (l - 1000) / 2 past each end',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'trimmers of a recess of 1000: (l - 1000) / 2 past each end',
      },
    ],
  },
  {
    id: '1y25csp',
    symbol: 'past',
    meaning: 'Half of a placed bar past its line',
    formula: 'l / 2',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: half of 822 is enough, of 821 not',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'diagonal bars develop half their length in full: 822 is enough, 821 is not',
      },
    ],
  },
  {
    id: '1baroyi',
    symbol: 'past',
    meaning: 'Bar past its line as far as the concrete goes',
    formula: 'slab',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: 300 to the edge less 30 cover: 270',
        test: 'tests/engine/pan-bars.test.ts',
        name: 'bars that meet the edge are developed only as far as the concrete goes',
      },
    ],
  },
  {
    id: '8m4khs',
    symbol: 'past',
    meaning: 'Bars past the strip at the joint, on the deeper side',
    formula: 'l / 2 - strip',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'Geometry of the bars',
        section: 'length past the line',
        tag: 'derived',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: half of the lap counts half of the area',
        test: 'tests/engine/joint.test.ts',
        name: 'bars that are too short count for less, and not at all where they end within the strip',
      },
    ],
  },
  {
    id: '1553434',
    symbol: 'fctm',
    meaning: 'Mean tensile strength of concrete up to C50/60',
    formula: '0.3 * exp(2 / 3 * log(fck))',
    unit: 'MPa',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: 'Table 3.1',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '24fxtp',
    symbol: 'fbd',
    meaning: 'Bond strength: eta1 1.0 in good and 0.7 in poor bond, eta2 1.0 up to 32 mm',
    formula: '2.25 * eta1 * eta2 * alphaCt * 0.7 * fctm / gammaC',
    unit: 'MPa',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.4.2 to 8.4.4',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: 'zn51l4',
    symbol: 'lmin',
    meaning: 'Least anchorage',
    formula: 'max(0.3 * lb, 10 * d, 100)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.4.2 to 8.4.4',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): 10 MPa in 12 mm: 120; in 8 mm: 100',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: 'the least length holds where little stress is asked for: max(0.3 lb,rqd, 10 d, 100)',
      },
    ],
  },
  {
    id: '1vu3m4a',
    symbol: 'alpha2',
    meaning: 'Credit for cover to a straight bar',
    formula: 'min(1, max(0.7, 1 - 0.15 * (cd - d) / d))',
    unit: '-',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: 'Table 8.2',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1jrvey6',
    symbol: 'lbd',
    meaning: 'Anchorage',
    formula: 'max(alpha1 * alpha2 * lb, lmin)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.4.2 to 8.4.4',
        tag: 'digest',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1c47s82',
    symbol: 'alpha6',
    meaning: 'Factor for the share of bars lapped at one section, per cent',
    formula: 'min(1.5, max(1, sqrt(rho1 / 25)))',
    unit: '-',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.7.3',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: 'jubfo5',
    symbol: 'l0',
    meaning: 'Lap',
    formula: 'max(alpha1 * alpha2 * alpha6 * lb, 0.3 * alpha6 * lb, 15 * d, 200)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.7.3',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
        test: 'tests/published/en-1992-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '9wfi8i',
    symbol: 'lHook',
    meaning: 'Straight end of the hook of a closed link past its bend',
    formula: 'max(10 * d, 70)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'EN 1992-1-1:2004',
        section: '8.5, Fig. 8.5',
        tag: 'memory',
        bases: ['en-1992'],
      },
    ],
    proofs: [
      {
        value: 'By hand (from memory): links of 10: 100',
        test: 'tests/engine/anchorage-check.test.ts',
        name: 'hooks of links of 10: 10 d = 100 straight past the bend (8.5, Fig. 8.5, from memory)',
      },
    ],
  },
  {
    id: '3f1da2',
    symbol: 'k3',
    meaning: 'Credit for cover',
    formula: 'min(1, max(0.7, 1 - 0.15 * (cd - d) / d))',
    unit: '-',
    families: ['anchorage'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'A01, A02 (secondary): 12 mm in 32 MPa, cd 30: 348, lap 428.1; 16 mm: 529.6, lap 662',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '7z90xp',
    symbol: 'Lsytb',
    meaning:
      'Length that develops the yield strength: k1 1.3 with more than 300 of concrete below, strength up to 65 MPa',
    formula: 'max(0.5 * k1 * k3 * fsy * d / ((132 - d) / 100 * sqrt(fc)), 0.058 * fsy * k1 * d)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'A01, A02 (secondary): 12 mm in 32 MPa, cd 30: 348, lap 428.1; 16 mm: 529.6, lap 662',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1qg8han',
    symbol: 'Lst',
    meaning: 'Length that develops a stress',
    formula: 'sigma / fsy * Lsytb',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'A01, A02 (secondary): 12 mm in 32 MPa, cd 30: 348, lap 428.1; 16 mm: 529.6, lap 662',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1cze52v',
    symbol: 'lmin',
    meaning: 'Least length that counts',
    formula: '12 * d',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.1.2.2 to 13.1.2.6',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (secondary): at 150 MPa 0.3 of the length, 12 diameters at least',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: 'at 150 MPa a bar needs 0.3 of its length, 12 diameters at least',
      },
    ],
  },
  {
    id: '1k6ixdg',
    symbol: 'Lsytlap',
    meaning: 'Lap: k7 1.0 where half of the bars are lapped and half their strength is enough, otherwise 1.25',
    formula: 'max(k7 * 0.5 * k1 * k3 * fsy * d / ((132 - d) / 100 * sqrt(fc)), 0.058 * fsy * k1 * d)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.2.2',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'A01, A02 (secondary): 12 mm in 32 MPa, cd 30: 348, lap 428.1; 16 mm: 529.6, lap 662',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: '$id: $diameter mm in $strength MPa, cd $cd',
      },
    ],
  },
  {
    id: '1roi87z',
    symbol: 'lHook',
    meaning: 'Straight end of the hook of a closed link past its bend',
    formula: 'max(4 * d, 70)',
    unit: 'mm',
    families: ['anchorage'],
    clauses: [
      {
        source: 'AS 3600:2018',
        section: '13.1.2.7',
        tag: 'secondary',
        bases: ['as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand (secondary): 4 diameters, 70 at least',
        test: 'tests/published/as-3600-anchorage.test.ts',
        name: 'straight past the bend 4 diameters, 70 at least',
      },
    ],
  },
  {
    id: '1vffqw4',
    symbol: 'fmin',
    meaning: 'Lowest specimen of the set',
    formula: 'min(f1, …, fn)',
    unit: 'MPa',
    families: ['strength'],
    clauses: [
      {
        source: 'Common practice',
        section: 'lowest specimen, cured on site',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: (21.4 + 22.4 + 23.1) / 3 = 22.3 is over 22, the lowest is not',
        test: 'tests/engine/strength.test.ts',
        name: 'two sets that are short both stand, each at its age; order of entry does not matter',
      },
    ],
  },
  {
    id: '2m4u54',
    symbol: 'fmean',
    meaning: 'Mean of the set, for information',
    formula: '(f1 + … + fn) / n',
    unit: 'MPa',
    families: ['strength'],
    clauses: [
      {
        source: 'Common practice',
        section: 'lowest specimen, cured on site',
        tag: 'practice',
        bases: ['en-1992', 'as-3600'],
      },
    ],
    proofs: [
      {
        value: 'By hand: (21.4 + 22.4 + 23.1) / 3 = 22.3 is over 22, the lowest is not',
        test: 'tests/engine/strength.test.ts',
        name: 'two sets that are short both stand, each at its age; order of entry does not matter',
      },
    ],
  },
  {
    id: '95cdjr',
    symbol: 'L',
    meaning: 'Cut length of shape 00, straight',
    formula: 'A',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L01 (digest): A 5800: 5800',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'orhufo',
    symbol: 'L25',
    meaning: 'Length of each bar as ordered: up to the next step',
    formula: 'n * s',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666',
        section: 'rounding of dimensions and lengths',
        tag: 'memory',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand (from memory): the next 25 and never less',
        test: 'tests/engine/schedule/cut-length.test.ts',
        name: 'a straight bar of $A is cut $length, the next 25 and never less',
      },
    ],
  },
  {
    id: 'zfzamx',
    symbol: 'L',
    meaning: 'Cut length of shape 11, one bend of 90 degrees',
    formula: 'A + B - 0.5 * r - d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L02 (digest): 12 mm, 800 and 200: 976',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '6tdxuo',
    symbol: 'L',
    meaning: 'Cut length of shape 12, one bend of 90 degrees with radius R',
    formula: 'A + B - 0.43 * R - 1.2 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L14 (digest): 16 mm, 600, 700, R 200: 1194.8',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'amju9y',
    symbol: 'L',
    meaning: 'Cut length of shape 13, hairpin with a semicircle',
    formula: 'A + 0.57 * B + C - 1.6 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L13 (digest): 12 mm, 700, 120, 400: 1149.2',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '1sa7wmv',
    symbol: 'L',
    meaning: 'Cut length of shape 15, one bend other than 90 degrees',
    formula: 'A + C',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand: shape 15, 500 and 700: 1200',
        test: 'tests/published/bs-8666.test.ts',
        name: 'shape 15: 500 + 700 = 1200, whatever the bend (by hand)',
      },
    ],
  },
  {
    id: '3ffmwm',
    symbol: 'L',
    meaning: 'Cut length of shape 21, hairpin',
    formula: 'A + B + C - r - 2 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L03 (digest): 10 mm, 600, 150, 600: 1310',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '9zg4ry',
    symbol: 'L',
    meaning: 'Cut length of shape 22, bend and semicircle',
    formula: 'A + B + 0.57 * C + D - 0.5 * r - 2.6 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L19 (secondary): 12 mm, 500, 300, 120, 250: 1075.2',
        test: 'tests/published/bs-8666.test.ts',
        name: 'L19: shape 22 differs from 2005 (medium confidence, one secondary source)',
      },
    ],
  },
  {
    id: '1m6y33i',
    symbol: 'L',
    meaning: 'Cut length of shape 25, two sloping ends',
    formula: 'A + B + E',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L17 (digest): 400, 400, 900: 1700',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '1mqxahg',
    symbol: 'L',
    meaning: 'Cut length of shape 26, crank',
    formula: 'A + B + C',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L15 (digest): 900, 350, 900: 2150',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '1a7hp44',
    symbol: 'L',
    meaning: 'Cut length of shape 31, three bends one way',
    formula: 'A + B + C + D - 1.5 * r - 3 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L05 (digest): 12 mm, 200, 500, 200, 500: 1328',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '1l3gtej',
    symbol: 'L',
    meaning: 'Cut length of shape 33, closed loop with round ends',
    formula: '2 * A + 1.7 * B + 2 * C - 4 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L11 (digest): 10 mm, 400, 100, 200: 1330',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'i9v553',
    symbol: 'L',
    meaning: 'Cut length of shape 41, hat or chair',
    formula: 'A + B + C + D + E - 2 * r - 4 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L10 (digest): 12 mm, 300, 200, 600, 200, 300: 1504',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'hcj1hj',
    symbol: 'L',
    meaning: 'Cut length of shape 47, open link',
    formula: '2 * A + B + max(21 * d, 240)',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'memory-unsure',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): 10 mm, 400 and 150: 1190',
        test: 'tests/engine/schedule/cut-length.test.ts',
        name: 'shape $code, $d mm, shortest hooks: $L (digest; 47 in 2020 from memory, unsure)',
      },
    ],
  },
  {
    id: '1w0aki3',
    symbol: 'L',
    meaning: 'Cut length of shape 47, open link',
    formula: '2 * A + B + 2 * C + 1.5 * r - 3 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'memory-unsure',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand (from memory, unsure): 10 mm, 400, 150, 130: 1210',
        test: 'tests/published/bs-8666.test.ts',
        name: 'shape 47 stands on the form of 2005 and says that it is unsure (from memory)',
      },
    ],
  },
  {
    id: 'v7xlms',
    symbol: 'L',
    meaning: 'Cut length of shape 51, closed link',
    formula: '2 * A + 2 * B + max(16 * d, 160)',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): 12 mm, 400 and 150: 1292',
        test: 'tests/engine/schedule/cut-length.test.ts',
        name: 'shape $code, $d mm, shortest hooks: $L (digest; 47 in 2020 from memory, unsure)',
      },
    ],
  },
  {
    id: '16ahl1t',
    symbol: 'L',
    meaning: 'Cut length of shape 51, closed link',
    formula: '2 * (A + B + C) - 2.5 * r - 5 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L06 (digest): 10 mm, 330, 140, 130: 1100',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: '4dyzwy',
    symbol: 'L',
    meaning: 'Cut length of shape 63, double link',
    formula: '2 * A + 3 * B + max(14 * d, 150)',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand (digest): 12 mm, 400 and 150: 1418',
        test: 'tests/engine/schedule/cut-length.test.ts',
        name: 'shape $code, $d mm, shortest hooks: $L (digest; 47 in 2020 from memory, unsure)',
      },
    ],
  },
  {
    id: '1rq0lpe',
    symbol: 'L',
    meaning: 'Cut length of shape 63, double link',
    formula: '2 * A + 3 * B + 2 * C - 3 * r - 6 * d',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L12 (digest): 10 mm, 500, 150, 130: 1590',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'uxwu19',
    symbol: 'L',
    meaning: 'Cut length of shape 75, ring',
    formula: 'pi * (A - d) + B + 25',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand (secondary): 10 mm, A 300, B 400: 1336.1',
        test: 'tests/published/bs-8666.test.ts',
        name: 'shape 75 is 25 mm longer than in 2005 (one secondary source)',
      },
    ],
  },
  {
    id: 'tiqz6f',
    symbol: 'L',
    meaning: 'Cut length of shape 77, helix',
    formula: 'C * sqrt((pi * (A - d)) * (pi * (A - d)) + B * B)',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L08 (digest): 8 mm, A 130, pitch 45, five turns: 1929.5',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'wbqsav',
    symbol: 'L',
    meaning: 'Cut length of shape 77, helix',
    formula: 'C * pi * (A - d)',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'Table 5',
        tag: 'secondary',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L09 (digest): 12 mm, A 330, six turns: 5994.2',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
  {
    id: 'zmpauo',
    symbol: 'L',
    meaning: 'Cut length typed beside a drawn shape',
    formula: 'L0',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2020',
        section: 'shape 99, length as drawn',
        tag: 'practice',
        bases: [],
      },
      {
        source: 'BS 8666:2005',
        section: 'shape 99, length as drawn',
        tag: 'practice',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'By hand: 1610 typed is scheduled 1625',
        test: 'tests/engine/schedule/cut-length.test.ts',
        name: 'a drawn shape takes its typed length, rounded up',
      },
    ],
  },
  {
    id: 'z8hmzx',
    symbol: 'L',
    meaning: 'Cut length of shape 75, ring',
    formula: 'pi * (A - d) + B',
    unit: 'mm',
    families: ['schedule'],
    clauses: [
      {
        source: 'BS 8666:2005',
        section: 'Table 3',
        tag: 'digest',
        bases: [],
      },
    ],
    proofs: [
      {
        value: 'L16 (digest): 10 mm, A 300, B 400: 1311.1',
        test: 'tests/published/bs-8666.test.ts',
        name: '$id: shape $code, $d mm',
      },
    ],
  },
]
