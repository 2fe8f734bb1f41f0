import { CRACK_CHOICE, type Reading } from './basis'

/** Where EN 1992-1-1 gives no number or is stretched; named, with range, accepted once per job. */
export const EN_WINDOW = 'en-window'
export const EN_STEEL_300 = 'en-steel-300'
export const EN_STEEL_ALT = 'en-steel-alt'
export const EN_OWN_PRISM = 'en-own-prism'
export const EN_TIE_BACK = 'en-tie-back'
export const EN_TIE_BACK_OWN = 'en-tie-back-own'
export const EN_DEAD_END = 'en-dead-end'
export const EN_JOINT = 'en-joint-strip'
export const EN_SHORTFALL = 'en-shortfall'
export const EN_CRACK_EDGE_BARS = 'en-crack-edge-bars'
export const EN_CRACK_MINIMUM = 'en-crack-minimum'
export const EN_CRACK_STRONGER = 'en-crack-stronger'

const RANGE =
  'One anchor, or each anchor of a row on its own, at a face square to its tendon within 20 degrees, in a section ' +
  'that stays the same over one prism length.'

export const EN_READINGS: readonly Reading[] = [
  {
    id: EN_WINDOW,
    title: 'Bursting steel counts from 0.2 b to 1.0 b behind the bearing face',
    text:
      'EN 1992-1-1 6.5.3 gives no length over which bursting steel counts. Steel counts from 0.2 b to 1.0 b behind the ' +
      'bearing face, b being the prism in the plane, and goes on to the face with the same intensity. In an elastic ' +
      'prism the tension starts at 0.09 to 0.25 b and 90 % of it lies before 1.0 b.',
    range: RANGE,
    clause: { source: 'EN 1992-1-1:2004', section: '6.5.3, silent on length', tag: 'computed' },
    proposed: true,
  },
  {
    id: EN_STEEL_300,
    title: 'Bursting steel at 300 MPa for 1.2 times the jacking force',
    text:
      'The tie is sized for the factored force, 1.2 times the force while jacking, at a steel stress of 300 MPa, so ' +
      'that no crack-width check follows: As = T / 300.',
    range: RANGE,
    clause: { source: 'EN 1992-1-1:2004', section: '8.10.3(4), 2.4.2.2(3)', tag: 'memory' },
    proposed: true,
  },
  {
    id: EN_STEEL_ALT,
    title: 'Bursting steel at yield for the factored force, at 300 MPa for the unfactored force',
    text:
      'Strength and crack width apart: the larger of T / fyd with the factored force and (T / 1.2) / 300 with the ' +
      'unfactored force. It asks for 0.83 of the steel of the other reading where the second governs.',
    range: RANGE,
    clause: { source: 'EN 1992-1-1:2004', section: '8.10.3(4), 6.5.3', tag: 'memory' },
    proposed: false,
  },
  {
    id: EN_OWN_PRISM,
    title: 'Off centre, the own prism of the anchor alone',
    text:
      'An anchor off the middle of the thickness is checked in its own prism alone, twice the distance to the nearer ' +
      'face. Without this reading the prism at mid-thickness is checked too and the worse of the two counts, so that ' +
      'moving towards a face never looks like a gain.',
    range: 'Plate up to 0.6 of its own prism; above it the rule is low by 16 % at 0.70 and 40 % at 0.90 (computed).',
    clause: { source: 'EN 1992-1-1:2004', section: '6.5.3, silent on anchors off centre', tag: 'computed' },
    proposed: false,
  },
  {
    id: EN_TIE_BACK,
    title: 'Tie behind an anchor inside the slab for a quarter of its force',
    text:
      'EN 1992-1-1 gives no number for the tension behind an anchor inside the slab. A quarter of the force while ' +
      'jacking, unfactored, is tied back at no more than 0.6 of the yield strength, without credit for compression that ' +
      'is there. In elastic theory the force is 0.25 to 0.5 of it.',
    range: 'An anchor inside the slab with concrete behind its bearing face; bars developed on both sides of the face.',
    clause: { source: 'AASHTO LRFD', section: 'intermediate anchors, without credit for compression', tag: 'memory' },
    proposed: true,
  },
  {
    id: EN_TIE_BACK_OWN,
    title: 'Tie behind an anchor inside the slab for the engineer’s own force',
    text:
      'The tie force comes from the engineer’s own strut-and-tie model and is written at the pan with its reason. Steel ' +
      'at no more than 0.6 of the yield strength.',
    range: 'Pans at which a tie force and its reason are written.',
    clause: { source: 'EN 1992-1-1:2004', section: '6.5, 8.10.3, silent on a number', tag: 'memory' },
    proposed: false,
  },
  {
    id: EN_DEAD_END,
    title: 'Bonded dead ends: all force at the bulbs for bursting, none before lpt2 for precompression',
    text:
      'No clause covers splayed strands with bulbs. For bursting, edge distance and corners all force enters at the bulbs, ' +
      'over the width of the splay. For edge wedges and strips none is counted before the upper transmission length ' +
      'lpt2 behind them, unless test data of the hardware say otherwise.',
    range: 'Strands of one tendon splayed in one plane, each with its own bulb, in concrete of constant depth.',
    clause: { source: 'EN 1992-1-1:2004', section: '8.10.2.2, silent on bulbs', tag: 'derived' },
    proposed: true,
  },
  {
    id: EN_JOINT,
    title: 'Joint: the strip without precompression is as wide as the wedges of both sides together',
    text:
      'No clause gives the width of the strip without precompression at a construction joint. It is the depth of the edge ' +
      'wedge on one side and on the other, added at each place along the joint, and as deep behind an anchor as its ' +
      'bearing face or its bond is set back.',
    range: 'Joints square to the tendons within 20 degrees whose edges on both sides are entered.',
    clause: { source: 'EN 1992-1-1:2004', section: '8.10.3(5), silent on joints', tag: 'derived' },
    proposed: true,
  },
  {
    id: EN_SHORTFALL,
    title: 'Where a tendon stops short of its edge, bars for its force and its moment',
    text:
      'No clause says what takes the place of a tendon that stops in a pan. Across the strip between pan and edge, half ' +
      'way to the next tendon on each side, bars of both faces yield at the tendon’s proof load together, the bars of ' +
      'each face at its moment, and they are not less than the crack steel that the job has chosen. Partial factors ' +
      'stand on both sides and fall out.',
    range: 'Strips from a pan to an edge that the jack faces within 45 degrees, in a slab of constant depth.',
    clause: { source: 'EN 1992-1-1:2004', section: 'silent on tendons that stop short', tag: 'derived' },
    proposed: true,
  },
  {
    id: EN_CRACK_EDGE_BARS,
    title: 'Edge wedges: ordinary edge bars only',
    text: 'No crack width is aimed at in edge wedges: the bars along the edge are all that is asked for.',
    range: 'Edges where cracks are accepted: nothing is sealed or seen, and the slab is free to shorten.',
    clause: { source: 'EN 1992-1-1:2004', section: '7.3.2(1)', tag: 'memory' },
    proposed: false,
    choice: CRACK_CHOICE,
  },
  {
    id: EN_CRACK_MINIMUM,
    title: 'Edge wedges: least steel for the job’s crack width',
    text:
      'Eq. 7.1 in full tension with the stress of Table 7.2N for the job’s crack width, after its bar-size correction ' +
      '(Eq. 7.7N), at the tensile strength that the job gives or the 28-day mean. Compression that the engineer counts ' +
      'does not lower it.',
    range: 'Crack width 0.1 to 0.4; below 0.2 the stress is lowered in proportion from the column for 0.2.',
    clause: { source: 'EN 1992-1-1:2004', section: '7.3.2(2) Eq. 7.1, 7.3.3(2) Table 7.2N', tag: 'memory' },
    proposed: true,
    choice: CRACK_CHOICE,
  },
  {
    id: EN_CRACK_STRONGER,
    title: 'Edge wedges: steel for a crack width one step less',
    text:
      'As the least steel, for a crack width 0.1 smaller than the job’s; where that would be less than half of it, for ' +
      'half of it.',
    range: 'Crack width 0.1 to 0.4; below 0.2 the stress is lowered in proportion from the column for 0.2.',
    clause: { source: 'EN 1992-1-1:2004', section: '7.3.2(2) Eq. 7.1, 7.3.3(2) Table 7.2N', tag: 'memory' },
    proposed: false,
    choice: CRACK_CHOICE,
  },
]
