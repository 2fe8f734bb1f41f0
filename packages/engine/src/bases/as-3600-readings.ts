import { CRACK_CHOICE, type Reading } from './basis'

/** Where AS 3600 gives no number or covers fewer anchors than a slab edge has; accepted once per job. */
export const AS_ROW = 'as-row'
export const AS_OWN_PRISM = 'as-own-prism'
export const AS_TIE_BACK = 'as-tie-back'
export const AS_TIE_BACK_OWN = 'as-tie-back-own'
export const AS_DEAD_END = 'as-dead-end'
export const AS_JOINT = 'as-joint-strip'
export const AS_SHORTFALL = 'as-shortfall'
export const AS_CRACK_EDGE_BARS = 'as-crack-edge-bars'
export const AS_CRACK_MINOR = 'as-crack-minor'
export const AS_CRACK_MODERATE = 'as-crack-moderate'
export const AS_CRACK_STRONG = 'as-crack-strong'

const CRACK = { source: 'AS 3600:2018', section: '9.5.3', tag: 'secondary' } as const

export const AS_READINGS: readonly Reading[] = [
  {
    id: AS_ROW,
    title: 'A near-equal row: each anchor in its own prism, as wide as the spacing',
    text:
      'AS 3600 12.5 covers at most two anchors in an elevation or plan and asks for strut-and-tie beyond. In a near-equal ' +
      'row each anchor is checked in its own prism of the width of the spacing, and the force along the face comes from ' +
      'the exact elastic row. The lever of 0.6 of the spacing is never run over more than two anchors.',
    range:
      'Five or more anchors of equal force whose largest gap is at most 1.2 of the smallest, without the outermost anchor ' +
      'and gap at each end.',
    clause: { source: 'AS 3600:2018', section: '12.5, at most two anchors', tag: 'computed' },
    proposed: true,
  },
  {
    id: AS_OWN_PRISM,
    title: 'Off centre, the own prism of the anchor alone',
    text:
      'An anchor off the middle of the thickness is checked in its symmetric prism alone, twice the distance to the nearer ' +
      'face, as the clause has it. Without this reading the prism at mid-thickness is checked too and the worse of the ' +
      'two counts, so that moving towards a face never looks like a gain.',
    range: 'Plate up to 0.6 of its own prism; above it the rule is low by 16 % at 0.70 and 40 % at 0.90 (computed).',
    clause: { source: 'AS 3600:2018', section: '12.5.4', tag: 'digest' },
    proposed: false,
  },
  {
    id: AS_TIE_BACK,
    title: 'Tie behind an anchor inside the slab for a quarter of its force',
    text:
      'AS 3600 gives no number for the tension behind an anchor inside the slab. A quarter of the force while jacking, ' +
      'unfactored, is tied back at no more than 0.6 of the yield strength, without credit for compression that is there. ' +
      'In elastic theory the force is 0.25 to 0.5 of it.',
    range: 'An anchor inside the slab with concrete behind its bearing face; bars developed on both sides of the face.',
    clause: { source: 'AASHTO LRFD', section: 'intermediate anchors, without credit for compression', tag: 'memory' },
    proposed: true,
  },
  {
    id: AS_TIE_BACK_OWN,
    title: 'Tie behind an anchor inside the slab for the engineer’s own force',
    text:
      'The tie force comes from the engineer’s own strut-and-tie model and is written at the pan with its reason. Steel ' +
      'at no more than 0.6 of the yield strength.',
    range: 'Pans at which a tie force and its reason are written.',
    clause: { source: 'AS 3600:2018', section: 'Section 7, silent on a number', tag: 'digest' },
    proposed: false,
  },
  {
    id: AS_DEAD_END,
    title: 'Bonded dead ends: all force at the bulbs for bursting, none before 60 diameters for precompression',
    text:
      'No clause covers splayed strands with bulbs. For bursting, edge distance and corners all force enters at the bulbs, ' +
      'over the width of the splay. For edge wedges and strips none is counted before the transmission length of 60 ' +
      'strand diameters behind them, unless test data of the hardware say otherwise.',
    range: 'Strands of one tendon splayed in one plane, each with its own bulb, in concrete of constant depth.',
    clause: { source: 'AS 3600:2018', section: '13.3, silent on bulbs', tag: 'derived' },
    proposed: true,
  },
  {
    id: AS_JOINT,
    title: 'Joint: the strip without precompression is as wide as the wedges of both sides together',
    text:
      'No clause gives the width of the strip without precompression at a construction joint. It is the depth of the edge ' +
      'wedge on one side and on the other, added at each place along the joint, and as deep behind an anchor as its ' +
      'bearing face or its bond is set back.',
    range: 'Joints square to the tendons within 20 degrees whose edges on both sides are entered.',
    clause: { source: 'AS 3600:2018', section: '12.5, silent on joints', tag: 'derived' },
    proposed: true,
  },
  {
    id: AS_SHORTFALL,
    title: 'Where a tendon stops short of its edge, bars for its force and its moment',
    text:
      'No clause says what takes the place of a tendon that stops in a pan. Across the strip between pan and edge, half ' +
      'way to the next tendon on each side, bars of both faces yield at the tendon’s proof load together, the bars of ' +
      'each face at its moment, and they are not less than the crack steel that the job has chosen. Capacity factors ' +
      'stand on both sides and fall out.',
    range: 'Strips from a pan to an edge that the jack faces within 45 degrees, in a slab of constant depth.',
    clause: { source: 'AS 3600:2018', section: 'silent on tendons that stop short', tag: 'derived' },
    proposed: true,
  },
  {
    id: AS_CRACK_EDGE_BARS,
    title: 'Edge wedges: ordinary edge bars only',
    text: 'No crack control is aimed at in edge wedges: the bars along the edge are all that is asked for.',
    range: 'Edges free to shorten where cracks are accepted.',
    clause: CRACK,
    proposed: false,
    choice: CRACK_CHOICE,
  },
  {
    id: AS_CRACK_MINOR,
    title: 'Edge wedges: minor degree of crack control',
    text: 'Both faces together (1.75 - 2.5 sigma cp) b D / 1000, for a direction that is held against shortening.',
    range: 'Internal exposure, where cracks are of little importance for use and looks.',
    clause: CRACK,
    proposed: false,
    choice: CRACK_CHOICE,
  },
  {
    id: AS_CRACK_MODERATE,
    title: 'Edge wedges: moderate degree of crack control',
    text: 'Both faces together (3.5 - 2.5 sigma cp) b D / 1000, for a direction that is held against shortening.',
    range: 'Internal exposure, and exposures A1 and A2 outside.',
    clause: CRACK,
    proposed: true,
    choice: CRACK_CHOICE,
  },
  {
    id: AS_CRACK_STRONG,
    title: 'Edge wedges: strong degree of crack control',
    text: 'Both faces together (6.0 - 2.5 sigma cp) b D / 1000, for a direction that is held against shortening.',
    range: 'Every exposure; the only degree for B1, B2, C1 and C2.',
    clause: CRACK,
    proposed: false,
    choice: CRACK_CHOICE,
  },
]
