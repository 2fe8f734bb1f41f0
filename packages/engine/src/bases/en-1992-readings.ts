import type { Reading } from './basis'

/** Where EN 1992-1-1 gives no number or is stretched; named, with range, accepted once per job. */
export const EN_WINDOW = 'en-window'
export const EN_STEEL_300 = 'en-steel-300'
export const EN_STEEL_ALT = 'en-steel-alt'
export const EN_OWN_PRISM = 'en-own-prism'

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
]
