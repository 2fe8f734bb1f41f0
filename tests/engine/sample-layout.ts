import type {
  Anchor,
  Edge,
  EdgeLength,
  EdgeLine,
  GridLine,
  Hardware,
  JobSettings,
  Layout,
  Pan,
  Pour,
  Steel,
  Tendon,
} from '@wedgeline/engine'

/** Flat slab anchorage of the invented podium: plate 220 x 80, pocket 300 x 120 x 110. */
export const S4: Hardware = {
  id: 'S4',
  name: 'S4',
  description: '',
  kind: 'plate',
  ends: 'live',
  strandsMax: 4,
  approval: null,
  plate: { width: 220, height: 80 },
  hole: { width: 70, height: 20, isRound: false },
  duct: { width: 70, height: 20, isRound: false },
  pocket: { width: 300, height: 120, depth: 110 },
  deviceLength: 0,
  splayLength: null,
  transmissionLength: null,
  spacingAlongMin: 350,
  spacingHeightMin: 350,
  edgeAlongMin: 190,
  edgeHeightMin: 75,
  straightBehindMin: 600,
  strandTailMin: 600,
  drawIn: 6,
  localSteel: {
    kind: 'links',
    isTested: true,
    diameter: 10,
    width: 300,
    height: 140,
    hook: 130,
    count: 4,
    first: 30,
    pitch: 50,
  },
  jackId: null,
}

/** Round beam anchorage: plate 170 x 170, pocket 220 x 220 x 120. */
export const B7: Hardware = {
  ...S4,
  id: 'B7',
  name: 'B7',
  strandsMax: 7,
  plate: { width: 170, height: 170 },
  hole: { width: 72, height: 72, isRound: true },
  duct: { width: 60, height: 60, isRound: true },
  pocket: { width: 220, height: 220, depth: 120 },
  spacingAlongMin: 260,
  spacingHeightMin: 260,
  edgeAlongMin: 160,
  edgeHeightMin: 160,
  straightBehindMin: 800,
  localSteel: {
    kind: 'spiral',
    isTested: true,
    diameter: 12,
    outside: 230,
    pitch: 55,
    turns: 6,
    flatTurns: 2,
    first: 0,
  },
}

/** Bonded dead end: splay 300 x 80, lpt2 1228. */
export const D4: Hardware = {
  ...S4,
  id: 'D4',
  name: 'D4',
  kind: 'bonded-splay',
  ends: 'dead',
  plate: { width: 300, height: 80 },
  hole: null,
  pocket: null,
  splayLength: 900,
  transmissionLength: 1228,
  straightBehindMin: 900,
  localSteel: null,
}

export const POUR: Pour = {
  id: 'P1',
  levelId: 'L1',
  mark: 'P1',
  title: '',
  thickness: 220,
  concrete: 'C32/40',
  fck: 32,
  aggregate: 20,
  coverTop: 30,
  coverSoffit: 30,
  coverEdge: 30,
  outline: rectangle(19200, 17400),
  regions: [],
  mats: [],
  stages: [
    { id: 'st1', name: '25 %', share: 0.25, strength: 9 },
    { id: 'st2', name: 'Full', share: 1, strength: 22 },
  ],
  markPrefix: '',
  firstMark: 1,
  deliveries: [],
}

export const SETTINGS: JobSettings = {
  pocketToFaceMin: 25,
  pocketToPocketMin: 25,
  clearGapMin: 20,
  nearFrom: 0.95,
  fyk: 500,
  stockLength: 12000,
  barStandard: 'bs-8666-2020',
  reinforcementGrade: 'B500B',
  wedgeSpread: null,
  spreadStart: 'bearing-face',
  frictionFamily: 'inside',
  frictionMu: 0.19,
  frictionWobble: 0.0075e-3,
  frictionMuLow: 0.15,
  frictionWobbleLow: 0.005e-3,
  frictionMuHigh: 0.25,
  frictionWobbleHigh: 0.01e-3,
  deadEndForce: 'jacking',
  crackWidth: 0.3,
  crackTensile: null,
  crackAgeDays: null,
  crackCompression: 0,
  exposure: '',
  restraint: '',
  barSizes: [8, 10, 12, 16, 20],
  oneLengthWithin: 100,
  oneLengthMass: 5,
  bentDeduction: 10,
}

/** Corners a to d, counter-clockwise from the south-west. */
export function rectangle(width: number, height: number): Pour['outline'] {
  return [
    { id: 'a', x: 0, y: 0 },
    { id: 'b', x: width, y: 0 },
    { id: 'c', x: width, y: height },
    { id: 'd', x: 0, y: height },
  ]
}

export function length(from: number, to: number, change: Partial<EdgeLength> = {}): EdgeLength {
  return { id: `l${from}`, from, to, kind: 'free', top: 220, soffit: 0, jackClear: 1500, access: '', ...change }
}

/** South, east, north and west line of the rectangle; east and west run north, south and north run east. */
export const SOUTH: EdgeLine = { id: 'south', levelId: 'L1', mark: 'E2', x: 0, y: 0, azimuth: Math.PI / 2 }
export const EAST: EdgeLine = { id: 'east', levelId: 'L1', mark: 'J1', x: 19200, y: 0, azimuth: 0 }
export const NORTH: EdgeLine = { id: 'north', levelId: 'L1', mark: 'E4', x: 0, y: 17400, azimuth: Math.PI / 2 }
export const WEST: EdgeLine = { id: 'west', levelId: 'L1', mark: 'E1', x: 0, y: 0, azimuth: 0 }

export function edge(line: EdgeLine, cornerId: string, lengths: readonly EdgeLength[]): Edge {
  return { id: line.mark, pourId: 'P1', edgeLineId: line.id, mark: line.mark, cornerId, isChord: false, lengths }
}

export const EDGES: readonly Edge[] = [
  edge(SOUTH, 'a', [length(0, 19200)]),
  edge(EAST, 'b', [length(0, 17400)]),
  edge(NORTH, 'c', [length(0, 19200)]),
  edge(WEST, 'd', [length(0, 17400)]),
]

export function anchor(edgeId: string, number: number, change: Partial<Anchor> = {}): Anchor {
  const id = `${edgeId}-${number}`
  return {
    id,
    tendonId: `T${id}`,
    edgeId,
    panId: null,
    number,
    end: 'live',
    hardwareId: 'S4',
    castWithPourId: 'P1',
    stressedWithPourId: 'P1',
    chainage: 0,
    height: 110,
    setBack: 110,
    skew: 0,
    elevation: 0,
    straightBehind: 900,
    ...change,
  }
}

export const deadEnd = (edgeId: string, number: number, change: Partial<Anchor> = {}): Anchor =>
  anchor(edgeId, number, { end: 'dead', hardwareId: 'D4', setBack: 300, ...change })

export function pan(id: string, change: Partial<Pan>): Pan {
  return {
    id,
    pourId: 'P1',
    mark: id,
    x: 0,
    y: 0,
    azimuth: 0,
    along: 1000,
    across: 350,
    depth: 150,
    jackId: null,
    jackTilt: 0,
    bentNose: 0,
    headroom: null,
    tieBackForce: null,
    tieBackReason: '',
    ...change,
  }
}

export const inPan = (panId: string): Anchor =>
  anchor(panId, 1, { id: `${panId}-anchor`, edgeId: null, panId, setBack: 0 })

const gridLine = (name: string, place: Pick<GridLine, 'x' | 'y' | 'azimuth'>): GridLine => ({
  id: name,
  name,
  ...place,
})

export const GRID: readonly GridLine[] = [
  ...[300, 8700, 17100, 25500, 33300].map((x, i) => gridLine('ABCDE'.charAt(i), { x, y: 0, azimuth: 0 })),
  ...[900, 8700, 17100].map((y, i) => gridLine(String(i + 1), { x: 0, y, azimuth: Math.PI / 2 })),
]

export interface Parts {
  readonly pour?: Partial<Pour>
  readonly hardware?: readonly Hardware[]
  readonly edgeLines?: readonly EdgeLine[]
  readonly edges?: readonly Edge[]
  readonly anchors?: readonly Anchor[]
  readonly pans?: readonly Pan[]
  readonly steel?: readonly Steel[]
  readonly more?: Partial<Layout>
}

/** Pour P2 east of P1 on the same south line, from 19.2 to 34.2 m, with its edge E2-P2. */
export function twoPours(anchors: readonly Anchor[]): Parts {
  const outline = [
    { id: 'q', x: 19200, y: 0 },
    { id: 'r', x: 34200, y: 0 },
    { id: 's', x: 34200, y: 17400 },
    { id: 't', x: 19200, y: 17400 },
  ]
  return {
    edges: [...EDGES, { ...edge(SOUTH, 'q', [length(19200, 34200)]), id: 'E2-P2', pourId: 'P2' }],
    anchors,
    more: { pours: [POUR, { ...POUR, id: 'P2', mark: 'P2', outline }] },
  }
}

/** One pour, 19.2 by 17.4 m, whose tendons are made from its anchors. */
export function layout(parts: Parts = {}): Layout {
  const { pour = {}, hardware = [S4, B7, D4], edges = EDGES, anchors = [], pans = [], steel = [], more = {} } = parts
  return {
    job: {
      id: 'job',
      number: 'QM-1',
      title: 'Quillmarsh Yard Podium (invented)',
      basis: 'en-1992',
      factors: [],
      readings: [],
      settings: SETTINGS,
    },
    levels: [{ id: 'L1', mark: 'L1', title: '' }],
    gridLines: GRID,
    strandTypes: [
      {
        id: 'strand',
        name: '12.7',
        diameter: 12.7,
        area: 98.7,
        breakingLoad: 184_000,
        proofLoad: 165_500,
        modulus: 195_000,
      },
    ],
    jacks: [],
    hardware,
    edgeLines: parts.edgeLines ?? [SOUTH, EAST, NORTH, WEST],
    joints: [],
    obstructions: [],
    pours: [{ ...POUR, ...pour }],
    edges,
    pans,
    tendons: tendonsOf(anchors),
    anchors,
    steel,
    barMarks: [],
    concreteResults: [],
    ...more,
  }
}

function tendonsOf(anchors: readonly Anchor[]): Tendon[] {
  return anchors.map(({ tendonId, hardwareId }) => ({
    id: tendonId,
    pourId: 'P1',
    mark: tendonId,
    strandTypeId: 'strand',
    strands: hardwareId === 'B7' ? 7 : 4,
    jackingRatio: 0.8,
    stressedFrom: 'one-end',
    path: [],
    length: null,
    drape: null,
  }))
}
