import { demoLayout } from '../../db/seed/demo-layout'
import { placeOf } from './layout-edits'

/** One change to the demo's file, and the field and message that it must lead to. */
export interface Wrong {
  readonly what: string
  readonly path: string
  readonly value: unknown
  readonly field: string
  readonly message: RegExp
}

type Line = [what: string, path: string, value: unknown, field: string, message: RegExp]
const wrong = (lines: readonly Line[]): Wrong[] =>
  lines.map(([what, path, value, field, message]) => ({ what, path, value, field, message }))

const square = (...points: [number, number][]) =>
  points.map(([xMm, yMm], i) => ({ id: `own-corner-${i + 1}`, xMm, yMm }))

const anchor = (id: string) => `anchors[${placeOf('anchors', id)}]`

const e2 = placeOf('edges', 'E2-P1')
const e4 = placeOf('edges', 'E4-P1')
const s4 = placeOf('hardware', 'S4')
const d4 = placeOf('hardware', 'D4')
const b7 = placeOf('hardware', 'B7')
const bars = placeOf('steel', 'edge-bars-E1-1')
const bow = square([0, 0], [10, 10], [10, 0], [0, 10])

const e1 = placeOf('anchors', 'L1P1-E01W')

/** A field of the wrong kind, size or name. */
export const WRONG_FIELDS: readonly Wrong[] = wrong([
  [
    'a thickness left out',
    'pours.0.thicknessMm',
    undefined,
    'pours[0].thicknessMm',
    /is missing; must be a number of mm/,
  ],
  [
    'a number in quotation marks',
    'pours.0.thicknessMm',
    '220',
    'pours[0].thicknessMm',
    /write 220 without quotation marks/,
  ],
  [
    'words for a number',
    'pours.0.fckMPa',
    'C32/40',
    'pours[0].fckMPa',
    /must be a number of MPa in digits 0 to 9, not text/,
  ],
  ['Arabic digits', 'pours.0.thicknessMm', '٢٢٠', 'pours[0].thicknessMm', /in digits 0 to 9/],
  ['a decimal comma', 'pours.0.thicknessMm', '220,5', 'pours[0].thicknessMm', /in digits 0 to 9/],
  ['null for a number', 'anchors.0.chainageMm', null, 'anchors[0].chainageMm', /must be a number of mm, not null/],
  ['a list for a number', 'anchors.0.heightMm', [110], 'anchors[0].heightMm', /not a list/],
  [
    'NaN',
    'anchors.0.heightMm',
    Number.NaN,
    'anchors[0].heightMm',
    /must be a number of mm, not the result of a failed/,
  ],
  ['infinity', 'anchors.0.heightMm', Infinity, 'anchors[0].heightMm', /not infinite/],
  ['thickness 0', 'pours.0.thicknessMm', 0, 'pours[0].thicknessMm', /must be more than 0/],
  ['a thickness of -0', 'pours.0.thicknessMm', -0, 'pours[0].thicknessMm', /must be more than 0/],
  ['a negative cover', 'pours.0.coverTopMm', -1, 'pours[0].coverTopMm', /must be 0 or more/],
  [
    '1e308',
    'anchors.0.chainageMm',
    1e308,
    'anchors[0].chainageMm',
    /1e\+308 is out of range; must be at most 10000000/,
  ],
  ['half a strand', 'tendons.0.strands', 3.5, 'tendons[0].strands', /must be a whole number/],
  ['no strand', 'tendons.0.strands', 0, 'tendons[0].strands', /must be 1 or more/],
  ['a jacking ratio above 0.95', 'tendons.0.jackingRatio', 80, 'tendons[0].jackingRatio', /must be at most 0.95/],
  ['a skew beyond 60', 'anchors.0.skewDeg', 61, 'anchors[0].skewDeg', /61 is out of range; must be at most 60/],
  ['a bar that nobody rolls', 'steel.0.shape.diameterMm', 11, 'steel[0].shape.diameterMm', /must be a bar size/],
  ['a shape that is none', 'steel.0.shape.kind', 'helix', 'steel[0].shape.kind', /must be one of "spiral", "links"/],
  ['another version', 'version', 2, 'version', /must be 1, the only version/],
  ['another format', 'format', 'layout', 'format', /must be "wedgeline.layout"/],
  ['an unknown basis', 'job.basis', 'en-1999', 'job.basis', /must be one of "en-1992", "as-3600"/],
  [
    'a factor that the basis does not have',
    'job.factors',
    [{ name: 'gammaX', value: 1.2, reason: 'typed wrong' }],
    'job.factors[0].name',
    /"gammaX" is not a factor of this basis: gammaP, gammaC/,
  ],
  [
    'a factor beyond its range',
    'job.factors',
    [{ name: 'gammaP', value: 2.01, reason: 'too much' }],
    'job.factors[0].value',
    /must lie in 1 to 2/,
  ],
  ['an empty basis', 'job.basis', '', 'job.basis', /must be one of "en-1992", "as-3600"/],
  ['a misspelt end', 'anchors.0.end', 'alive', 'anchors[0].end', /must be one of "live", "dead"/],
  ['a time zone of no place', 'job.timeZone', 'Mars/Base', 'job.timeZone', /is no time zone; must be an IANA name/],
  ['no title', 'job.title', '', 'job.title', /must not be empty/],
  ['an id with a blank', 'levels.0.id', 'L 1', 'levels[0].id', /letters, digits, dots, colons or dashes/],
  ['a field with its unit left off', 'pours.0.thickness', 220, 'pours[0].thickness', /is no field of the layout file/],
  ['an empty pour', 'pours.0', {}, 'pours[0].outline', /is missing; must be a list/],
  [
    'a pour with two corners',
    'pours.0.outline',
    square([0, 0], [1, 0]),
    'pours[0].outline',
    /needs three points|corners/,
  ],
  ['no stage', 'pours.0.stages', [], 'pours[0].stages', /needs at least one stage/],
  ['levels that are missing', 'levels', undefined, 'levels', /is missing; must be a list in square brackets/],
  ['anchors that are no list', 'anchors', {}, 'anchors', /must be a list in square brackets, not a group of fields/],
])

/** Rows of the right shape that contradict one another; refused. */
export const CONTRADICTIONS: readonly Wrong[] = wrong([
  ['one id twice', 'anchors.1.id', 'L1P1-N01S', 'anchors[1].id', /"L1P1-N01S" is taken by anchors\[0\]\.id/],
  ['one corner id twice', 'pours.1.outline.0.id', 'P1-corner-1', 'pours[1].outline[0].id', /is taken by pours\[0\]/],
  ['one mark twice', 'pours.1.mark', 'P1', 'pours[1].mark', /"P1" is taken by pours\[0\]\.mark/],
  [
    'one number twice',
    `anchors.${placeOf('anchors', 'L1P1-N02S')}.number`,
    1,
    `${anchor('L1P1-N02S')}.number`,
    /is taken by anchors\[0\]/,
  ],
  ['a tendon that is not there', 'anchors.0.tendonId', 'T9', 'anchors[0].tendonId', /"T9" is no tendon of this file/],
  ['hardware that is not there', 'anchors.0.hardwareId', 'S9', 'anchors[0].hardwareId', /is no hardware/],
  ['a pour that is not there', 'tendons.0.pourId', 'P9', 'tendons[0].pourId', /is no pour/],
  ['a jack that is not there', `hardware.${s4}.jackId`, 'J9', `hardware[${s4}].jackId`, /is no jack/],
  ['an anchor nowhere', 'anchors.0.edgeId', null, 'anchors[0].edgeId', /neither edge nor pan/],
  ['an anchor in two places', 'anchors.0.panId', 'PN01', 'anchors[0].edgeId', /both an edge and a pan/],
  ['a tendon with three ends', 'anchors.2.tendonId', 'L1P1-N01', 'anchors[2].tendonId', /a tendon has two ends/],
  [
    'an anchor cast with the wrong pour',
    'anchors.0.castWithPourId',
    'P2',
    'anchors[0].castWithPourId',
    /belongs to pour "P1"/,
  ],
  [
    'a clockwise outline',
    'pours.2.outline',
    demoLayout().pours[2]?.outline.toReversed(),
    'pours[2].outline',
    /runs clockwise/,
  ],
  ['an outline that crosses itself', 'pours.2.outline', bow, 'pours[2].outline', /crosses itself/],
  [
    'an outline without area',
    'pours.2.outline',
    square([0, 0], [5, 0], [9, 0]),
    'pours[2].outline',
    /encloses no area/,
  ],
  [
    'an outline closed by hand',
    'pours.2.outline',
    square([0, 0], [9, 0], [9, 9], [0, 0]),
    'pours[2].outline[3]',
    /stands on the next corner/,
  ],
  ['covers that fill the slab', 'pours.0.thicknessMm', 60, 'pours[0].thicknessMm', /leaves no room between covers/],
  ['stages that do not grow', 'pours.0.stages.1.share', 0.25, 'pours[0].stages[1].share', /does not grow from 0.25/],
  [
    'stages that stop short',
    'pours.0.stages.1.share',
    0.9,
    'pours[0].stages[1].share',
    /the last stage must have share 1/,
  ],
  ['a strength that falls', 'pours.0.stages.1.strengthMPa', 8.9, 'pours[0].stages[1].strengthMPa', /must not fall/],
  ['two outer layers', 'pours.0.mats.0.isOuter', true, 'pours[0].mats[1].isOuter', /only one can be outer/],
  ['spare bars by nobody', 'pours.0.mats.0.spareShare', 0.5, 'pours[0].mats[0].spareBy', /must name who says/],
  [
    'a corner of another pour',
    `edges.${e2}.cornerId`,
    'P2-corner-1',
    `edges[${e2}].cornerId`,
    /is no corner of pour P1/,
  ],
  [
    'two edges on one side',
    `edges.${e2}.cornerId`,
    'P1-corner-4',
    `edges[${e2}].cornerId`,
    /starts at this corner already/,
  ],
  ['an edge askew to its line', 'edgeLines.0.azimuthDeg', 1, 'edges[0].edgeLineId', /is not parallel to edge line E1/],
  [
    'an edge beside its line',
    'edgeLines.0.xMm',
    6,
    'edges[0].edgeLineId',
    /stands 6 mm beside edge line E1; .* within 5 mm/,
  ],
  ['a line of another level', 'edgeLines.0.levelId', 'L2', 'edges[0].edgeLineId', /belongs to another level/],
  [
    'a length missing',
    `edges.${e4}.lengths.1`,
    { ...demoLayout().edges[e4]?.lengths[1], fromMm: 5900 },
    `edges[${e4}].lengths[1].fromMm`,
    /leaves the edge from 5800 mm uncovered/,
  ],
  [
    'lengths that overlap',
    `edges.${e4}.lengths.1.fromMm`,
    5700,
    `edges[${e4}].lengths[1].fromMm`,
    /overlaps the length before/,
  ],
  [
    'lengths that stop short',
    `edges.${e4}.lengths.2.toMm`,
    19000,
    `edges[${e4}].lengths[2].toMm`,
    /stops short of the end of the edge/,
  ],
  [
    'lengths that run on',
    `edges.${e4}.lengths.2.toMm`,
    19300,
    `edges[${e4}].lengths[2].toMm`,
    /runs beyond the end of the edge; must be 19200 mm/,
  ],
  ['a length backwards', `edges.${e4}.lengths.1.toMm`, 5800, `edges[${e4}].lengths[1].toMm`, /is not beyond fromMm/],
  [
    'a top below the soffit',
    `edges.${e4}.lengths.1.topMm`,
    0,
    `edges[${e4}].lengths[1].topMm`,
    /is not above the soffit/,
  ],
  [
    'a joint beside no pour of its own',
    'joints.0.firstPourId',
    'P3',
    'joints[0].firstPourId',
    /has no edge on the line of this joint/,
  ],
  [
    'a hole as large as the plate',
    `hardware.${s4}.hole.widthMm`,
    220,
    `hardware[${s4}].hole.widthMm`,
    /must be less than 220 mm/,
  ],
  [
    'a round hole with two sizes',
    `hardware.${b7}.hole.heightMm`,
    70,
    `hardware[${b7}].hole.heightMm`,
    /a round hole has one size/,
  ],
  [
    'a splay without length',
    `hardware.${d4}.splayLengthMm`,
    null,
    `hardware[${d4}].splayLengthMm`,
    /needs the length of its splay/,
  ],
  ['a splay that is stressed', `hardware.${d4}.ends`, 'both', `hardware[${d4}].ends`, /cannot be stressed/],
  [
    'an approval that does not grow',
    `hardware.${s4}.approval.strengths.1.share`,
    0.25,
    `hardware[${s4}].approval.strengths[1].share`,
    /does not grow/,
  ],
  [
    'an approval with falling strength',
    `hardware.${s4}.approval.strengths.1.strengthMinMPa`,
    9,
    `hardware[${s4}].approval.strengths[1].strengthMinMPa`,
    /does not grow/,
  ],
  [
    'a strand weaker than its proof load',
    'strandTypes.0.proofLoadKN',
    184,
    'strandTypes[0].proofLoadKN',
    /must be less than the breaking load/,
  ],
  [
    'links that cannot be bent',
    `hardware.${s4}.localSteel.widthMm`,
    20,
    `hardware[${s4}].localSteel.widthMm`,
    /must be more than 20 mm/,
  ],
  [
    'edge bars that end before they start',
    `steel.${bars}.shape.toMm`,
    50,
    `steel[${bars}].shape.toMm`,
    /must be more than 50 mm/,
  ],
  ['steel of another pour', `steel.${bars}.pourId`, 'P2', `steel[${bars}].pourId`, /lies in pour "P1"/],
  [
    'a gap beside an anchor elsewhere',
    `steel.${bars}.zone`,
    { kind: 'gap', edgeId: 'E1', afterAnchorId: 'L1P1-N01S', beforeAnchorId: null },
    `steel[${bars}].zone.afterAnchorId`,
    /neither on this edge nor in a pan/,
  ],
])

/** What cannot be built and is kept as typed. */
export const STOPS: readonly Wrong[] = wrong([
  [
    'an anchor off its edge',
    'anchors.0.chainageMm',
    19201,
    'anchors[0].chainageMm',
    /19201 mm is off edge E2-P1; must lie within 0 mm to 19200 mm/,
  ],
  ['an anchor before its edge', 'anchors.0.chainageMm', -1, 'anchors[0].chainageMm', /is off edge E2-P1/],
  [
    'a plate beyond the end of its edge',
    'anchors.0.chainageMm',
    109,
    'anchors[0].chainageMm',
    /must lie within 110 mm to 19090 mm/,
  ],
  [
    'a plate below the soffit',
    `anchors.${e1}.heightMm`,
    39,
    `anchors[${e1}].heightMm`,
    /beyond the soffit at 0 mm; must lie within 40 mm to 180 mm/,
  ],
  ['a plate above the top', `anchors.${e1}.heightMm`, 181, `anchors[${e1}].heightMm`, /beyond the top at 220 mm/],
  [
    'plates that overlap',
    `anchors.${e1}.chainageMm`,
    8000,
    `${anchor('L1P1-E02W')}.chainageMm`,
    /overlaps that of E1-03, 200 mm away; must be 220 mm away/,
  ],
  [
    'a plate above its pan',
    `anchors.${placeOf('anchors', 'L1P1-N04P')}.heightMm`,
    181,
    `${anchor('L1P1-N04P')}.heightMm`,
    /beyond the slab/,
  ],
  ['a pan outside the slab', 'pans.0.yMm', 17401, 'pans[0].xMm', /outside pour P1/],
  ['a dead end on hardware that is stressed', 'anchors.0.end', 'dead', 'anchors[0].hardwareId', /S4 is for live ends/],
  [
    'more strands than the hardware holds',
    'tendons.0.strands',
    5,
    'anchors[0].hardwareId',
    /S4 holds 4 strands and the tendon has 5/,
  ],
])
