import type { Proof } from '../../features/methods/method'

/** What shows that formulas are right: a value from a source or by hand arithmetic, and the test that holds it. */
export interface ProofEntry extends Proof {
  /** `symbol = formula` as the list of methods has it. */
  readonly of: readonly string[]
}

const ANCHORS = 'tests/published/en-1992-anchors.test.ts'
const EDGES = 'tests/published/en-1992-edge-rules.test.ts'
const AS = 'tests/published/as-3600.test.ts'
const FRICTION = 'tests/published/friction.test.ts'
const ROWS = 'tests/published/row-series.test.ts'
const BARS = 'tests/published/bs-8666.test.ts'
const EN_LENGTHS = 'tests/published/en-1992-anchorage.test.ts'
const AS_LENGTHS = 'tests/published/as-3600-anchorage.test.ts'
const BEARING = 'tests/engine/bearing.test.ts'
const BURSTING = 'tests/engine/bursting.test.ts'
const GROUPS = 'tests/engine/groups.test.ts'
const COUNT = 'tests/engine/steel-count.test.ts'
const SPALLING = 'tests/engine/spalling.test.ts'
const DEAD_END = 'tests/engine/dead-end.test.ts'
const COVER = 'tests/engine/cover.test.ts'
const SPACING = 'tests/engine/spacing.test.ts'
const WEDGES = 'tests/engine/wedge/closed-form.test.ts'
const AREAS = 'tests/engine/wedge/areas.test.ts'
const EDGE_WEDGE = 'tests/engine/edge-wedge.test.ts'
const JOINT = 'tests/engine/joint.test.ts'
const ACCESS = 'tests/engine/pan-access.test.ts'
const PAN_BARS = 'tests/engine/pan-bars.test.ts'
const TENDON = 'tests/engine/tendon.test.ts'
const FIT = 'tests/engine/fit.test.ts'
const LENGTHS = 'tests/engine/anchorage-check.test.ts'
const CUTS = 'tests/engine/schedule/cut-length.test.ts'
const STRENGTH = 'tests/engine/strength.test.ts'
const CLOSE = 'tests/engine/close-anchors.test.ts'

/** Published values first, then those worked by hand. */
export const PROOFS: readonly ProofEntry[] = [
  {
    of: ['F = gammaP * P', 'T = 0.25 * F * (b - a) / b', 'As = T / sigmaS'],
    value: 'EX17 (digest): P 800 kN, slab 200, plate 75: F 960 kN, T 150 kN, 500 mm² at 300 MPa',
    test: ANCHORS,
    name: 'thickness: plate 75 in a 200 slab',
  },
  {
    of: ['T = 0.25 * F * (b - a) / b'],
    value: 'EX17 (digest): plate 220 at spacing 1000: T 187.2 kN, 624 mm²',
    test: ANCHORS,
    name: 'plan: plate 220 at spacing 1000',
  },
  {
    of: ['As = max(T / fyd, T / gammaP / sigmaS)', 'fyd = fyk / gammaS'],
    value: 'By hand: T 150 kN, fyd 217.4 MPa: 690 mm²; with fyd 434.8 MPa 416.7 mm²',
    test: ANCHORS,
    name: 'with a low yield strength the first part of the alternative governs',
  },
  {
    of: ['Pmax = n * min(kBreaking * Fpk, kProof * Fp01k)'],
    value: 'EX19 (derived): fpk 1860, fp0.1k 1640: 1476 MPa, 885.6 kN in four strands of 150 mm²',
    test: ANCHORS,
    name: 'jacking: min(0.8 fpk, 0.9 fp0.1k) = 1476 MPa, 885.6 kN in four strands',
  },
  {
    of: [
      'fctd = alphaCt * 0.7 * fctm / gammaC',
      'fbpt = etaP1 * eta1 * fctd',
      'lpt = alpha1 * alpha2 * d * sigmaPm0 / fbpt',
      'lpt1 = 0.8 * lpt',
      'lpt2 = 1.2 * lpt',
    ],
    value: 'EX21 (from memory): 15.2 mm strand, 1300 MPa, fck(t) 25: 980, 784 and 1176 mm',
    test: EDGES,
    name: '15.2 mm strand at 1300 MPa in fck(t) 25: 980 mm, 784 and 1176',
  },
  {
    of: [
      'fctEff = fctm',
      'phiS = d / (fctEff / 2.9 * h / (8 * (c + d / 2)))',
      'sigmaT = s1 + (s2 - s1) * (phiS - d1) / (d2 - d1)',
      'sigmaT02 = s1 + (s2 - s1) * (phiS - d1) / (d2 - d1)',
      'AsCrack = kc * k * fctEff * 1000 * h / sigmaS',
    ],
    value: 'By hand: slab 220, cover 30, 12 mm bars, 0.3 mm: 249.3 MPa, 2668 mm²/m',
    test: EDGES,
    name: '220 thick, cover 30, 12 mm bars, 0.3 mm: 249 MPa in place of 280, about 2667 mm2/m',
  },
  {
    of: ['AsCrack = kc * k * fctEff * 1000 * h / sigmaS'],
    value: 'C04 (read, table from memory): 280 MPa, 220 thick: 2376 mm²/m',
    test: EDGES,
    name: 'C04: at 280 MPa, that is 12 mm read in the table, 2376 mm2/m',
  },
  {
    of: ['k = max(0.65, min(1, 1 - 0.35 * (h - 300) / 500))'],
    value: 'By proportion: 1.0 at 300 thick, 0.825 at 550, 0.65 from 800',
    test: EDGES,
    name: 'self-stress: k is 1.0 up to 300 thick, 0.825 at 550, 0.65 from 800',
  },
  {
    of: ['sigmaS = min(sigmaT, fyk)', 'sigmaT = s'],
    value: 'By hand: 800 thick, 8 mm bars, fyk 250: 250 in place of 450 MPa',
    test: EDGES,
    name: 'the stress never exceeds the yield strength',
  },
  {
    of: ['sigmaT = s * d / phiS'],
    value: 'By hand: phi 215.3: 160 × 32 / 215.3 = 23.8 MPa',
    test: EDGES,
    name: 'beyond the last row the stress goes on falling, never below it by a jump',
  },
  {
    of: ['sigmaT = sigmaT02 * w / 0.2'],
    value: 'By proportion: half the stress of 0.2 mm at 0.1 mm',
    test: EDGES,
    name: 'one step less: 0.3 gives what 0.2 gives; 0.2 asks for twice its own, 0.1 for half of a width of 0.1',
  },
  {
    of: ['Asurf = 0.03 * P * gammaP / (fyk / gammaS)'],
    value: 'Published sheet (rule from memory): 2500 kN at 250 MPa: 360 mm²',
    test: EDGES,
    name: '2500 kN at 250 MPa: 360 mm2, as a published sheet has it',
  },
  {
    of: ['TEd = gammaP * T', 'AsT = TEd / sigmaS', 'As = max(AsT, Asurf)'],
    value: 'By hand: 0.088 P factored at 300 MPa',
    test: EDGES,
    name: 'a row asks for more: 0.088 P factored at 300 MPa',
  },
  {
    of: ['T = 0.25 * P', 'sigmaT = 0.6 * fy', 'As = T / sigmaT'],
    value: 'By hand (share from memory): 588.8 kN: 147.2 kN, 491 mm² at 300 MPa',
    test: EDGES,
    name: 'a quarter of 588.8 kN at 0.6 of 500 MPa: 147.2 kN, 491 mm2',
  },
  {
    of: ['T = Town'],
    value: 'By hand: own force 200 kN at 300 MPa: 666.7 mm²',
    test: PAN_BARS,
    name: 'the engineer’s own 200 kN at 300 MPa: 666.7 mm2, by a reading of its own, with its reason',
  },
  {
    of: ['kr = a / D', 'T = 0.25 * kP * P * (1 - kr)', 'As = T / sigmaS'],
    value: 'EX15 (digest): 1000 kN, 150 from the face, plate 165: kr 0.55, T 112.5 kN, 750 mm² at 150 MPa',
    test: AS,
    name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
  },
  {
    of: ['T = 0.25 * kP * P * (1 - kr)'],
    value: 'EX07 (textbook, from memory): 3000 kN, plate 315 in 1000: 513.75 kN, 3425 mm²',
    test: AS,
    name: 'EX07 in the depth: 513.75 kN, 3425 mm2, counted from 200 to 1000',
  },
  {
    of: ['Tf = kP * T'],
    value: 'EX15 (digest): 100 kNm over 0.6 × 700: 238.1 kN, 1587 mm²',
    test: AS,
    name: 'EX15-L1 at the face: 100 kNm over 0.6 * 700 is 238.1 kN, 1587 mm2',
  },
  {
    of: [
      'A1 = w * h',
      'Anet = A1 - Ahole',
      'k = min(bFree / w, hFree / h)',
      'A2 = k * k * A1',
      'sigma = kP * P / Anet',
      'phiFb = phi * min(0.9 * fc * sqrt(A2 / A1), 1.8 * fc)',
    ],
    value:
      'By hand (rule from memory): plate 300 by 120, hole 90 by 26, slab 220, 588.8 kN, 22 MPa: 17.49 of 21.78 MPa',
    test: AS,
    name: 'all of the force at 22 MPa: 17.49 of 21.78 MPa',
  },
  {
    of: ['Pmax = n * kJacking * Fpb'],
    value: 'By hand (share from memory): 0.85 of the breaking load',
    test: AS,
    name: '0.85 of the breaking load, whatever the proof load; after lock-off there is no limit',
  },
  {
    of: ['AsCrack = max(0, c - 2.5 * sigmaCp) * 1000 * D / 1000', 'D = min(h, 500)'],
    value: 'C01 to C03 (secondary): 220 thick: 385, 770 and 1320 mm²/m; strong with 1.2 MPa counted 660',
    test: AS,
    name: 'C01 minor 385, C02 moderate 770, strong 1320 mm2/m in a 220 slab',
  },
  {
    of: ['D = min(h, 500)'],
    value: 'By hand: over 500 thick 250 at each face counts',
    test: AS,
    name: 'over 500 thick only the outer 250 at each face counts',
  },
  {
    of: ['sMax = min(1.5 * h, 200)'],
    value: 'By hand (secondary): 200 at most, 1.5 of a slab thinner than 133.3',
    test: AS,
    name: 'spacing: 200 at most, in a slab thinner than 133.3 no more than 1.5 of it',
  },
  {
    of: ['Lpt = 60 * db'],
    value: 'By hand (rule from memory): 15.2 mm strand: 912 mm',
    test: AS,
    name: '60 diameters: 15.2 mm strand 912 mm, whatever stress and strength, without bounds',
  },
  {
    of: [
      'xFace = r * s',
      'T = 2 * P * xFace / (pi * a) * atan(sin(pi * a / s) / (exp(2 * pi * xFace / s) + cos(pi * a / s)))',
    ],
    value: 'Exact series, finite elements within 0.2 % (computed): a / s 0.1, 0.2, 0.3: 0.0880, 0.0860, 0.0827 P',
    test: ROWS,
    name: 'the steps hold the table and their text evaluates to them',
  },
  {
    of: ['u = mu * theta + k * L'],
    value: 'Krishna Raju (from memory): losses 50.5, 34.3 and 17.9 MPa of 1200; 51.6, 34.8 and 18.0 by the linear form',
    test: FRICTION,
    name: 'drape $drape: exact $exact, printed $linear by the linear form',
  },
  {
    of: ['u = mu * (theta + k * L)'],
    value: 'EX19 (derived): u 0.1026: 885.6 to 799.24 kN',
    test: FRICTION,
    name: 'far end 799.24 kN: 885.6 x e^-0.1026',
  },
  {
    of: ['dL = P0 * (1 - exp(0 - u / n)) / (u / n) * L / (E * A)'],
    value: 'EX19 (derived): 172.65 mm',
    test: FRICTION,
    name: 'elongation 172.65 mm: 885,600 x (1 - e^-0.1026) / 0.1026 x 24,000 / (195,000 x 600)',
  },
  {
    of: [
      'q = sqrt(w * E * A * u / L / P0)',
      'lSet = (0 - log(1 - q)) * L / u',
      'Panchor = P0 * exp(0 - 2 * u * lSet / L)',
    ],
    value: 'EX19 (derived): draw-in 6: 14.03 m, loss 100.1, after lock-off 785.5 kN',
    test: FRICTION,
    name: 'draw-in by the exact form: 14.03 m, loss 100.1, after lock-off 785.5 kN',
  },
  {
    of: ['Panchor = (P0 * (1 - exp(0 - u)) - w * E * A * u / L) / (exp(u) - 1)'],
    value: 'By hand: where draw-in just reaches the far end both forms give P0 e^-0.2',
    test: TENDON,
    name: 'just as long as the tendon: both forms give one force',
  },
  {
    of: ['Panchor = P0 - w * E * A / L'],
    value: 'By hand: 588.8 - 461.916 / 17.18 = 561.9 kN',
    test: TENDON,
    name: 'without friction P0 - w E A / L: 588.8 - 461.916 / 17.18 = 561.9 kN is over',
  },
  {
    of: ['plan = θ1 + … + θn', 'theta = plan + drape'],
    value: 'By hand: two bends of 45°: e^(-0.2 π / 2)',
    test: TENDON,
    name: 'counts a bend in plan by its angle: 45 degrees and back are a half of pi',
  },
  {
    of: ['Pfar = Pjack * exp(0 - u)'],
    value: 'By hand: 0.15 × (0.3 + 0.005 × 17.18) = 0.057885: 588.8 e^-0.057885',
    test: TENDON,
    name: 'dead: the jacking force, or after friction with the lowest pair (Eq. 5.45, from memory)',
  },
  {
    of: ['Pjack = n * (r * Fpk)'],
    value: 'By hand: 4 × 0.8 × 184 = 588.8 kN',
    test: TENDON,
    name: 'live: the jacking force, 4 x 0.8 x 184 = 588.8 kN, whatever the setting',
  },
  {
    of: [
      'P = share * Pjack',
      'sigma = F / Anet',
      'fcd = alphaCc * fck / gammaC',
      'sigmaRd = min(fcd * sqrt(Ac1 / Ac0), 3 * fcd)',
    ],
    value: 'By hand (Eq. 6.63, digest): 0.25 × 706.56 kN on 33,660 mm²: 5.25 MPa; 9 / 1.5 × 1.8333 = 11.0 MPa',
    test: BEARING,
    name: 'the same plate at 25 % of the force, 9 MPa',
  },
  {
    of: [
      'Ac0 = w * h',
      'Anet = Ac0 - Ahole',
      'k = min(bFree / w, hFree / h, kMax)',
      'Ac1 = k * k * Ac0',
      'sigma = F / Anet',
    ],
    value: 'By hand: two plates of 170 at 260, hole 72: 24,828 mm², 49.80 MPa against 22.43',
    test: BEARING,
    name: 'two beam plates of 170 at 260: k = 260 / 170 = 1.529',
  },
  {
    of: ['b = top - soffit', 'b = 2 * min(cTop, cSoffit)'],
    value: 'By hand: height 90 in 220: own prism 180, 327.1 mm²; mid-thickness 220, 374.7 mm²',
    test: BURSTING,
    name: 'off centre the mid-thickness value is taken, and the own prism is said beside it',
  },
  {
    of: ['b = 2 * min(before, after)'],
    value: 'By hand: half-gaps 675 and 1075: b 1350',
    test: BURSTING,
    name: 'the nearer half-gap sets the prism, and a wide gap beside it is said',
  },
  {
    of: ['Pjack = P1 + … + Pn'],
    value: 'By hand: two anchors, 0.25 × 2 F (5000 - 620) / 5000',
    test: GROUPS,
    name: 'its prism runs to the middle of the outer gaps',
  },
  {
    of: ['sc = max(2 * a, 0.3 * 2 * min(l1, l2))'],
    value: 'By hand (digest): plates 170: 340; far from others 0.3 × 2 × 900 = 540',
    test: CLOSE,
    name: '0.3 of the prism governs where the pair stands far from others',
  },
  {
    of: ['zc = 0.3 * D'],
    value: 'By hand (digest): section 700: 210, both sides',
    test: CLOSE,
    name: '$apart apart in a section 700 deep',
  },
  {
    of: ['Asi = n * legs * A * share', 'AsCounted = As1 + … + Asn'],
    value: 'By hand: three links of 10 inside 44 to 220, two legs each: 471.2 mm²',
    test: COUNT,
    name: 'cross with two legs each; the one at 30 stands before the window from 44',
  },
  {
    of: ['Asi = n * legs * A * share'],
    value: 'By hand: 225 of 300 past the line: 0.75 of the area; 119.9 counts nothing',
    test: COUNT,
    name: '$length long: half of it past the line counts with $share',
  },
  {
    of: ['Asi = spare * A / s * l * c * c'],
    value: 'By hand: 0.25 × 113.1 / 200 over 1400: 197.9 mm²',
    test: COUNT,
    name: 'count with the spare share only, along the edge',
  },
  {
    of: ['TEd = gammaP * T', 'AsT = TEd / sigmaS', 'xFace = r * s'],
    value: 'By hand: row at 1750, plates 220, 588.8 kN: 1.2 T / 300',
    test: SPALLING,
    name: 'asks at full force for 1.2 T / 300 (EN 1992-1-1 8.10.3(4), from memory)',
  },
  {
    of: ['sigmaP = share * Pjack / (n * Ap)', 'xTo = lower + b'],
    value: 'By hand: 588.8 kN / (4 × 98.7) = 1491.4 MPa; 818.5 + 220 = 1038.5 mm',
    test: DEAD_END,
    name: 'steel counts from the bulbs over the lower transmission length (from memory) and one prism',
  },
  {
    of: ['cs = z - zs'],
    value: 'By hand: 55 above the soffit, 75 asked for: short by 20',
    test: COVER,
    name: 'short by 20 at 55, and the height that mends it',
  },
  {
    of: ['ct = zt - z'],
    value: 'By hand: 220 - 145 = 75',
    test: COVER,
    name: '$height is $status below a top at 220',
  },
  {
    of: ['c = z - h / 2 - zs'],
    value: 'By hand: plate of 80 at 70: 30; pocket of 120 at 55: -5',
    test: COVER,
    name: 'pocket centred $height above the soffit is $status',
  },
  {
    of: ['c = zt - z - h / 2'],
    value: 'By hand: the mirror of plate and pocket at the soffit',
    test: COVER,
    name: 'upside down gives the same against the top',
  },
  {
    of: ['c = z - h / 2 - zf'],
    value: 'By hand: slab 220, plate 80 at 110, recess 150 deep: 0',
    test: COVER,
    name: 'recess $depth deep: $demand from plate to floor is $status',
  },
  {
    of: ['s = abs(x2 - x1)'],
    value: 'By hand: on both sides of 350, from either side',
    test: SPACING,
    name: '$spacing apart is $status, from either side',
  },
  {
    of: ['d = (s - (a1 + a2) / 2 + e1 * t1 + e2 * t2) / (t1 + t2)'],
    value: 'Z05 (derived): plates 220 at 1750: 765 at 45°, 1147.5 at arctan(2/3)',
    test: WEDGES,
    name: '1750 apart, plates 220',
  },
  {
    of: ['d = e + max(0, s - a / 2) / t'],
    value: 'By hand: end of the edge 900 away: 110 + 790 = 900; 110 + 790 × 1.5 = 1295',
    test: WEDGES,
    name: 'the end of the edge: set-back and the clear distance from the plate',
  },
  {
    of: ['d = e'],
    value: 'By hand: plates of 220 at 150, set back 110: 110',
    test: WEDGES,
    name: 'plates that overlap leave the strip before the bearing faces',
  },
  {
    of: ['d = (c2 - c1 + e1 * t1 + e2 * t2) / (t1 + t2)'],
    value: 'By hand: plates at 4000 and 8000 with pans between: from 4110 and 7890 at 45° to 1890 at 6000',
    test: AREAS,
    name: 'behind two pans the spread of the edge’s own anchors comes first',
  },
  {
    of: ['d = e + abs(x - c) / t'],
    value: 'By hand: 8490 - 4110 at 45°: 4380',
    test: AREAS,
    name: 'a tendon that stops short in a pan compresses only between its two ends',
  },
  {
    of: ['Asi = share * n * Abar * 1000 / w', 'AsAcross = As1 + … + Asn + AsMat'],
    value: 'By hand: 22 bars of 12 in both layers in 1.75 m: 22 × 129.254 mm²/m',
    test: EDGE_WEDGE,
    name: '$count bars in both layers: $status',
  },
  {
    of: ['share = max(0, min(1, lPast / lNeed))'],
    value: 'By hand: apex 1147.5, 410.8 needed: 1529 long counts in full, 205.4 less for half',
    test: EDGE_WEDGE,
    name: 'bars of $length count for $share',
  },
  {
    of: ['AsMat = m1 + … + mn'],
    value: 'By hand: 12 at 200, half spare: 282.7 mm²/m; at 30°, cos² = 0.75: 212.1',
    test: EDGE_WEDGE,
    name: 'the spare share of a mat counts where it runs across, and only that',
  },
  {
    of: ['w = d1 + d2', 'lBar = 2 * (max(d1, d2) + l0)', 'l0 = lap'],
    value: 'By hand (laps from memory): 700 each side, lap 616.2: 1400 and 2632',
    test: JOINT,
    name: 'each side 110 + (1400 - 220) / 2 = 700: 1400 together, with a lap on both sides',
  },
  {
    of: ['AsTie = AsAcross * b / 1000'],
    value: 'By hand: 70 bars of 12 between half the gaps',
    test: JOINT,
    name: 'bars between half the gaps beside the anchor count where they are developed past its bearing face',
  },
  {
    of: ['Lj = Lc + st + tl + hr'],
    value: 'By hand: 620 + 200 + 150 + 230 = 1200, 1 mm on both sides',
    test: ACCESS,
    name: '$clear in front of a jack of 1200 is $status',
  },
  {
    of: ['La = Lp / cos(t)'],
    value: 'By hand: 1170 / cos 15° = 1211.3',
    test: ACCESS,
    name: 'a tilted axis is longer than its plan: 1170 / cos 15 = 1211.3',
  },
  {
    of: ['La = (jc + sb) / cos(sk) / cos(el)'],
    value: 'By hand: 1090 + 110 = 1200, 1 mm on both sides',
    test: ACCESS,
    name: '$jackClear in front of the edge: $status',
  },
  {
    of: ['Hn = z + (Lc + st) * sin(t) + d / 2 * cos(t) - zt + ha'],
    value: 'By hand: 110 + 45 - 220 + 600 = 535',
    test: ACCESS,
    name: '$headroom clear above the slab: $status',
  },
  {
    of: ['g = z + x * tan(t) - d / 2 / cos(t) - (zt - dp + dp * x / lp)'],
    value: 'By hand: tilted 20°, nose 60: recess 143 deep leaves 1.075',
    test: ACCESS,
    name: 'recess $depth deep: $status',
  },
  {
    of: ['gs = (w - d) / 2'],
    value: 'By hand: 190 wide, body 90: 50 on each side',
    test: ACCESS,
    name: 'recess $across wide, 90 and twice 50 asked for: $status',
  },
  {
    of: ['Ncuti = m + 1', 'Ni = m + 1', 'Acuti = Ni * A', 'Acut = Acut1 + … + Acutn'],
    value: 'By hand: 940 + 2 × 30 at 200: six bars, 939 five',
    test: PAN_BARS,
    name: 'recess $along long: $bars bars across it',
  },
  {
    of: ['AsF = n * Fp01k / fyk', 'AsM = AsF * dp / (h - c - phi)', 'As = max(AsM, AsF / 2, AsC / 2)'],
    value: 'By hand: 4 × 165.5 / 500 = 1324 mm²; × 110 / 170 = 856.7 mm² in each face',
    test: PAN_BARS,
    name: 'bars for the force and the moment of the tendon (derived)',
  },
  {
    of: ['hr = zt - dp - zs'],
    value: 'By hand: 220 - 190 = 30, the cover',
    test: PAN_BARS,
    name: 'recess $depth deep in 220, cover 30: $status',
  },
  {
    of: ['Asi = n * A * share', 'AsCounted = As1 + … + Asn'],
    value: 'By hand: bars of 16, 300 of 421.5 past the face: 0.71 of the area; 264 counts nothing',
    test: PAN_BARS,
    name: '$past past the bearing face on each side counts with $share',
  },
  {
    of: ['D = h + ct + cs + 2 * dl'],
    value: 'By hand: spiral 160 + 30 + 30 = 220',
    test: FIT,
    name: 'spiral of $outside and two covers: $asked in 220 is $status',
  },
  {
    of: ['lb = d / 4 * sigma / fb', 'lmin = least', 'ld = k * max(lb, lmin)', 'l0 = lap'],
    value: 'E01 to E07 (digest, Table 8.2 from memory): 12 mm in 32 MPa: 410.8, 318.4 and a lap of 477.6',
    test: EN_LENGTHS,
    name: '$id: $diameter mm in $strength MPa, cd $cd',
  },
  {
    of: ['lb = d / 4 * sigma / fb', 'ld = k * max(lb, lmin)', 'l0 = lap'],
    value: 'AS 3600 13.1 and 13.2 (secondary): development and laps of seven bars',
    test: AS_LENGTHS,
    name: '$id: $diameter mm in $strength MPa, cd $cd',
  },
  {
    of: ['past = l'],
    value: 'By hand: bar of 240: 120 past the line, the least that counts',
    test: LENGTHS,
    name: 'transverse bars count from 120 past the line on, and not 1 mm below',
  },
  {
    of: ['past = leg - r - d'],
    value: 'By hand: leg 334 - 20 - 10 = 304 against 303.3',
    test: LENGTHS,
    name: 'legs of hairpins of 10: 2.5 x 300 / 2.4732 = 303.3 past r 20 and d 10',
  },
  {
    of: ['past = hook - r - d'],
    value: 'By hand: 130 - 20 - 10 = 100',
    test: LENGTHS,
    name: 'hooks of links of 10: 10 d = 100 straight past the bend (8.5, Fig. 8.5, from memory)',
  },
  {
    of: ['past = to - from'],
    value: 'By hand: overlap 614 against a lap of 613.1',
    test: LENGTHS,
    name: 'two sets: 614 of overlap is enough, 613 is not',
  },
  {
    of: ['past = (l - recess) / 2'],
    value: 'By hand: (l - 1000) / 2 past each end',
    test: LENGTHS,
    name: 'trimmers of a recess of 1000: (l - 1000) / 2 past each end',
  },
  {
    of: ['past = l / 2'],
    value: 'By hand: half of 822 is enough, of 821 not',
    test: LENGTHS,
    name: 'diagonal bars develop half their length in full: 822 is enough, 821 is not',
  },
  {
    of: ['past = cover + l - depth'],
    value: 'By hand: 30 + 1529 - 1147.5 = 411.5 past the apex',
    test: EDGE_WEDGE,
    name: 'bars of $length count for $share',
  },
  {
    of: ['past = slab'],
    value: 'By hand: 300 to the edge less 30 cover: 270',
    test: PAN_BARS,
    name: 'bars that meet the edge are developed only as far as the concrete goes',
  },
  {
    of: ['past = l / 2 - strip'],
    value: 'By hand: half of the lap counts half of the area',
    test: JOINT,
    name: 'bars that are too short count for less, and not at all where they end within the strip',
  },
  {
    of: ['fmin = min(f1, …, fn)', 'fmean = (f1 + … + fn) / n'],
    value: 'By hand: (21.4 + 22.4 + 23.1) / 3 = 22.3 is over 22, the lowest is not',
    test: STRENGTH,
    name: 'two sets that are short both stand, each at its age; order of entry does not matter',
  },
  {
    of: [
      'fctm = 0.3 * exp(2 / 3 * log(fck))',
      'fbd = 2.25 * eta1 * eta2 * alphaCt * 0.7 * fctm / gammaC',
      'alpha2 = min(1, max(0.7, 1 - 0.15 * (cd - d) / d))',
      'lbd = max(alpha1 * alpha2 * lb, lmin)',
      'alpha6 = min(1.5, max(1, sqrt(rho1 / 25)))',
      'l0 = max(alpha1 * alpha2 * alpha6 * lb, 0.3 * alpha6 * lb, 15 * d, 200)',
    ],
    value: 'E01 (digest, tables from memory): 12 mm in 32 MPa, cd 30: fbd 3.175, 410.8, 318.4, lap 477.6',
    test: EN_LENGTHS,
    name: '$id: $diameter mm in $strength MPa, cd $cd',
  },
  {
    of: ['lmin = max(0.3 * lb, 10 * d, 100)'],
    value: 'By hand (digest): 10 MPa in 12 mm: 120; in 8 mm: 100',
    test: EN_LENGTHS,
    name: 'the least length holds where little stress is asked for: max(0.3 lb,rqd, 10 d, 100)',
  },
  {
    of: [
      'k3 = min(1, max(0.7, 1 - 0.15 * (cd - d) / d))',
      'Lsytb = max(0.5 * k1 * k3 * fsy * d / ((132 - d) / 100 * sqrt(fc)), 0.058 * fsy * k1 * d)',
      'Lst = sigma / fsy * Lsytb',
      'Lsytlap = max(k7 * 0.5 * k1 * k3 * fsy * d / ((132 - d) / 100 * sqrt(fc)), 0.058 * fsy * k1 * d)',
    ],
    value: 'A01, A02 (secondary): 12 mm in 32 MPa, cd 30: 348, lap 428.1; 16 mm: 529.6, lap 662',
    test: AS_LENGTHS,
    name: '$id: $diameter mm in $strength MPa, cd $cd',
  },
  {
    of: ['lmin = 12 * d'],
    value: 'By hand (secondary): at 150 MPa 0.3 of the length, 12 diameters at least',
    test: AS_LENGTHS,
    name: 'at 150 MPa a bar needs 0.3 of its length, 12 diameters at least',
  },
  {
    of: ['lHook = max(10 * d, 70)'],
    value: 'By hand (from memory): links of 10: 100',
    test: LENGTHS,
    name: 'hooks of links of 10: 10 d = 100 straight past the bend (8.5, Fig. 8.5, from memory)',
  },
  {
    of: ['lHook = max(4 * d, 70)'],
    value: 'By hand (secondary): 4 diameters, 70 at least',
    test: AS_LENGTHS,
    name: 'straight past the bend 4 diameters, 70 at least',
  },
  {
    of: ['xFrom = 0.2 * b', 'xTo = b'],
    value: 'EX15 (digest): prism 300: from 60 to 300',
    test: AS,
    name: 'EX15-L1: each of two anchors of 1000 kN 150 from the faces, plate 165: 112.5 kN, 750 mm2, from 60 to 300',
  },
  {
    of: ['xFrom = 0.2 * b', 'xTo = b'],
    value: 'By hand (reading, computed): prism 220: from 44 to 220, three of four links count',
    test: BURSTING,
    name: 'plate 80 at mid-height of 220, 588.8 kN: the hardware links carry it',
  },
  {
    of: ['beta = atan(2 / 3)'],
    value: 'EX17 (from memory): plate 75 in 200: 93.75 mm; 220 at 1000: 585 mm',
    test: ANCHORS,
    name: 'spread at arctan(2/3): 93.75 mm in the thickness, 585 mm in plan',
  },
  {
    of: ['beta = atan(1)'],
    value: 'By hand (digest): 1 in 1: tan of the angle is 1',
    test: AS,
    name: 'force spreads at 1 in 1 (12.5, digest)',
  },
  { of: ['L = A'], value: 'L01 (digest): A 5800: 5800', test: BARS, name: '$id: shape $code, $d mm' },
  {
    of: ['L = A + B - 0.5 * r - d'],
    value: 'L02 (digest): 12 mm, 800 and 200: 976',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = A + B - 0.43 * R - 1.2 * d'],
    value: 'L14 (digest): 16 mm, 600, 700, R 200: 1194.8',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = A + 0.57 * B + C - 1.6 * d'],
    value: 'L13 (digest): 12 mm, 700, 120, 400: 1149.2',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = A + B + C - r - 2 * d'],
    value: 'L03 (digest): 10 mm, 600, 150, 600: 1310',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  { of: ['L = A + B + E'], value: 'L17 (digest): 400, 400, 900: 1700', test: BARS, name: '$id: shape $code, $d mm' },
  { of: ['L = A + B + C'], value: 'L15 (digest): 900, 350, 900: 2150', test: BARS, name: '$id: shape $code, $d mm' },
  {
    of: ['L = A + B + C + D - 1.5 * r - 3 * d'],
    value: 'L05 (digest): 12 mm, 200, 500, 200, 500: 1328',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = 2 * A + 1.7 * B + 2 * C - 4 * d'],
    value: 'L11 (digest): 10 mm, 400, 100, 200: 1330',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = A + B + C + D + E - 2 * r - 4 * d'],
    value: 'L10 (digest): 12 mm, 300, 200, 600, 200, 300: 1504',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = 2 * (A + B + C) - 2.5 * r - 5 * d'],
    value: 'L06 (digest): 10 mm, 330, 140, 130: 1100',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = 2 * A + 3 * B + 2 * C - 3 * r - 6 * d'],
    value: 'L12 (digest): 10 mm, 500, 150, 130: 1590',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = pi * (A - d) + B'],
    value: 'L16 (digest): 10 mm, A 300, B 400: 1311.1',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = C * pi * (A - d)'],
    value: 'L09 (digest): 12 mm, A 330, six turns: 5994.2',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = C * sqrt((pi * (A - d)) * (pi * (A - d)) + B * B)'],
    value: 'L08 (digest): 8 mm, A 130, pitch 45, five turns: 1929.5',
    test: BARS,
    name: '$id: shape $code, $d mm',
  },
  {
    of: ['L = A + C'],
    value: 'By hand: shape 15, 500 and 700: 1200',
    test: BARS,
    name: 'shape 15: 500 + 700 = 1200, whatever the bend (by hand)',
  },
  {
    of: ['L = A + B + 0.57 * C + D - 0.5 * r - 2.6 * d'],
    value: 'L19 (secondary): 12 mm, 500, 300, 120, 250: 1075.2',
    test: BARS,
    name: 'L19: shape 22 differs from 2005 (medium confidence, one secondary source)',
  },
  {
    of: ['L = pi * (A - d) + B + 25'],
    value: 'By hand (secondary): 10 mm, A 300, B 400: 1336.1',
    test: BARS,
    name: 'shape 75 is 25 mm longer than in 2005 (one secondary source)',
  },
  {
    of: ['L = 2 * A + B + 2 * C + 1.5 * r - 3 * d'],
    value: 'By hand (from memory, unsure): 10 mm, 400, 150, 130: 1210',
    test: BARS,
    name: 'shape 47 stands on the form of 2005 and says that it is unsure (from memory)',
  },
  {
    of: ['L = 2 * A + B + max(21 * d, 240)'],
    value: 'By hand (digest): 10 mm, 400 and 150: 1190',
    test: CUTS,
    name: 'shape $code, $d mm, shortest hooks: $L (digest; 47 in 2020 from memory, unsure)',
  },
  {
    of: ['L = 2 * A + 2 * B + max(16 * d, 160)'],
    value: 'By hand (digest): 12 mm, 400 and 150: 1292',
    test: CUTS,
    name: 'shape $code, $d mm, shortest hooks: $L (digest; 47 in 2020 from memory, unsure)',
  },
  {
    of: ['L = 2 * A + 3 * B + max(14 * d, 150)'],
    value: 'By hand (digest): 12 mm, 400 and 150: 1418',
    test: CUTS,
    name: 'shape $code, $d mm, shortest hooks: $L (digest; 47 in 2020 from memory, unsure)',
  },
  {
    of: ['L = L0'],
    value: 'By hand: 1610 typed is scheduled 1625',
    test: CUTS,
    name: 'a drawn shape takes its typed length, rounded up',
  },
  {
    of: ['L25 = n * s'],
    value: 'By hand (from memory): the next 25 and never less',
    test: CUTS,
    name: 'a straight bar of $A is cut $length, the next 25 and never less',
  },
  {
    of: ['dL = P0 * L / (E * A)'],
    value: 'By hand: 588.8 kN x 17,180 / (195,000 x 394.8) = 131.4 mm',
    test: TENDON,
    name: 'elongates without friction by P0 L / (E A): 588.8 x 17,180 / (195 x 394.8) = 131.4',
  },
  {
    of: ['AsC = am * w / 1000'],
    value: 'By hand (table from memory): 3627 mm²/m over 1.8 m and two faces: 3264 mm²',
    test: PAN_BARS,
    name: 'the crack steel that the job chose counts over the width of the strip (EN 7.3.2; table from memory)',
  },
]

/** General words for formulas whose meaning names what stands at one place: numbers of bars, strengths, stages. */
export const MEANINGS: Readonly<Record<string, string>> = {
  'P = share * Pjack': 'Force at the end of a stage of stressing',
  'Asi = n * legs * A * share':
    'One set of bars: number inside the window, legs across the plane, area of a bar, share developed',
  'Asi = spare * A / s * l * c * c': 'A mat: spare share, bar area over spacing, length of the window, direction',
  'Asi = n * A * share': 'One set of bars across the line: number, area of a bar, share developed on both sides',
  'Asi = share * n * Abar * 1000 / w': 'One set of wedge bars, for each metre of the edge',
  'AsCounted = As1 + … + Asn': 'Steel counted inside the window behind the bearing face',
  'sigmaP = share * Pjack / (n * Ap)': 'Stress of the strand at the end of a stage',
  'plan = θ1 + … + θn': 'Bends in plan; none between straight ends',
  'Pjack = P1 + … + Pn': 'Forces of anchors that act as one, together',
  'fctEff = fctm': 'Tensile strength when cracks are expected: the 28-day mean, or the job’s own',
  's = abs(x2 - x1)': 'Distance between two anchors along the edge or in height, or to the end of the edge',
  'c = zt - z - h / 2': 'Plate or pocket below top',
  'c = z - h / 2 - zs': 'Plate or pocket above soffit',
  'c = z - h / 2 - zf': 'Plate above the floor of the recess',
  'cs = z - zs': 'Centre of the anchor above soffit',
  'ct = zt - z': 'Centre of the anchor below top',
  'd = e + max(0, s - a / 2) / t': 'Depth of the edge wedge at the end of the edge: set-back and spread from one plate',
  'd = (s - (a1 + a2) / 2 + e1 * t1 + e2 * t2) / (t1 + t2)':
    'Depth of the edge wedge between two plates from the slab edge',
  'd = (c2 - c1 + e1 * t1 + e2 * t2) / (t1 + t2)': 'Depth of the edge wedge where two spreads meet, from the slab edge',
  'd = e + abs(x - c) / t': 'Depth of the edge wedge on the line of one spread, from the slab edge',
  'd = e': 'Depth of the strip before the bearing faces where spreads overlap at the face',
  'Lj = Lc + st + tl + hr': 'Length that the jack needs: closed, stroke, strand tail, hand room',
  'g = z + x * tan(t) - d / 2 / cos(t) - (zt - dp + dp * x / lp)':
    'Clear height under the jack, at its front and at the bearing face',
  'Ncuti = m + 1': 'Bars of a mat cut by the recess: whole spacings, and one',
  'Ni = m + 1': 'Bars of a mat cut or within cover of the recess: whole spacings, and one',
  'AsM = AsF * dp / (h - c - phi)': 'Bars at one face for the moment of the tendon that stops short',
  'As = max(AsM, AsF / 2, AsC / 2)': 'Bars asked for at one face of the strip',
  'hr = zt - dp - zs': 'Concrete under the recess',
  'lb = d / 4 * sigma / fb': 'Basic length to develop the stress',
  'l0 = lap': 'Lap of two bars',
  'D = h + ct + cs + 2 * dl': 'Depth that the steel and its covers take up',
  'past = l': 'Shorter end of a bar past the line that it crosses',
  'past = l / 2': 'Half of a placed bar past its line',
  'past = to - from': 'Overlap of two sets of edge bars',
  'past = slab': 'Bar past its line as far as the concrete goes',
  'L25 = n * s': 'Length of each bar as ordered: up to the next step',
  'L = L0': 'Cut length typed beside a drawn shape',
  'dL = P0 * L / (E * A)': 'Elongation without friction',
  'dL = P0 * (1 - exp(0 - u / n)) / (u / n) * L / (E * A)': 'Elongation, n 1 from one end and 2 from both',
  'sc = max(2 * a, 0.3 * 2 * min(l1, l2))': 'Spacing below which two anchors act as one in plan',
  'zc = 0.3 * D': 'Distance in height below which two anchors act as one',
}
