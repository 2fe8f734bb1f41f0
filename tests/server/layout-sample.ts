import { layoutSchema, type LayoutFile } from '@wedgeline/contract'

/** One pour of 12 m by 8 m with one edge along its south side, four anchors on it and one set of bars of each zone. */
export function sampleLayout(): LayoutFile {
  const distances = { spacingAlongMinMm: 350, spacingHeightMinMm: 350, edgeAlongMinMm: 190, edgeHeightMinMm: 75 }
  const row = {
    kind: 'transverse-bars',
    diameterMm: 10,
    lengthMm: 2000,
    count: 2,
    layers: 'both',
    firstMm: 60,
    pitchMm: 60,
  }
  const bars = {
    kind: 'edge-bars',
    diameterMm: 12,
    countTop: 1,
    countBottom: 1,
    firstMm: 60,
    pitchMm: 60,
    fromMm: 40,
    toMm: 11960,
  }
  const anchors = [1, 2, 3, 4].map((n) => ({
    id: `a${n}`,
    tendonId: `t${n}`,
    edgeId: 'e1',
    panId: null,
    number: n,
    end: 'live',
    hardwareId: 'h1',
    castWithPourId: 'p1',
    stressedWithPourId: 'p1',
    chainageMm: 1500 * n,
    heightMm: 110,
    setBackMm: 110,
  }))
  return layoutSchema.parse({
    format: 'wedgeline.layout',
    version: 1,
    job: { id: 'j1', number: '26-001', title: 'Invented podium' },
    levels: [{ id: 'l1', mark: 'L1' }],
    gridLines: [{ id: 'g1', name: 'A', xMm: 0, yMm: 0, azimuthDeg: 0 }],
    strandTypes: [{ id: 's1', name: '15.7', diameterMm: 15.7, areaMm2: 150, breakingLoadKN: 279, proofLoadKN: 246 }],
    jacks: [jack()],
    hardware: [
      {
        id: 'h1',
        name: 'Four-strand plate',
        kind: 'plate',
        ends: 'both',
        strandsMax: 4,
        approval: { reference: 'Invented 1', strengths: [{ share: 1, strengthMinMPa: 22, ...distances }] },
        plate: { widthMm: 220, heightMm: 80 },
        hole: { widthMm: 70, heightMm: 20, isRound: false },
        duct: { widthMm: 70, heightMm: 20, isRound: false },
        pocket: { widthMm: 300, heightMm: 120, depthMm: 110 },
        ...distances,
        straightBehindMinMm: 600,
        strandTailMinMm: 600,
        drawInMm: 6,
        jackId: 'k1',
      },
    ],
    edgeLines: [{ id: 'el1', levelId: 'l1', mark: 'S', xMm: 0, yMm: 0, azimuthDeg: 90 }],
    obstructions: [
      {
        id: 'o1',
        levelId: 'l1',
        kind: 'column',
        mark: 'C1',
        outline: [
          { xMm: 4000, yMm: 4000 },
          { xMm: 4400, yMm: 4000 },
          { xMm: 4400, yMm: 4400 },
        ],
      },
    ],
    pours: [pour()],
    edges: [
      {
        id: 'e1',
        pourId: 'p1',
        edgeLineId: 'el1',
        mark: 'E1',
        cornerId: 'c1',
        lengths: [
          { id: 'n1', fromMm: 0, toMm: 6000, kind: 'free', topMm: 220, soffitMm: 0 },
          { id: 'n2', fromMm: 6000, toMm: 12000, kind: 'free', topMm: 220, soffitMm: 0, jackClearMm: 1500 },
        ],
      },
    ],
    pans: [
      {
        id: 'q1',
        pourId: 'p1',
        mark: 'P1',
        xMm: 9000,
        yMm: 5000,
        azimuthDeg: 180,
        alongMm: 900,
        acrossMm: 500,
        depthMm: 150,
        jackId: 'k1',
      },
    ],
    tendons: anchors.map(({ tendonId }, i) => ({
      id: tendonId,
      pourId: 'p1',
      mark: `T${i + 1}`,
      strandTypeId: 's1',
      strands: 4,
      jackingRatio: 0.75,
    })),
    anchors,
    steel: [
      { id: 'b1', pourId: 'p1', zone: { kind: 'anchor', anchorId: 'a1' }, shape: row },
      { id: 'b2', pourId: 'p1', zone: { kind: 'edge', edgeId: 'e1' }, shape: bars },
      {
        id: 'b3',
        pourId: 'p1',
        zone: { kind: 'gap', edgeId: 'e1', afterAnchorId: 'a1', beforeAnchorId: 'a2' },
        shape: { kind: 'wedge-bars', diameterMm: 12, lengthMm: 1500, count: 3, layers: 'both' },
      },
    ],
    barMarks: [],
    concreteResults: [
      {
        id: 'r1',
        pourId: 'p1',
        ageHours: 24,
        cured: 'beside the pour',
        certificate: 'CT-1',
        specimensMPa: [24, 25.5, 23],
      },
    ],
  })
}

const jack = () => ({
  id: 'k1',
  name: 'Jack J1',
  closedLengthMm: 600,
  strokeMm: 200,
  strandTailMm: 600,
  handRoomMm: 100,
  bodyDiameterMm: 160,
  noseDiameterMm: 90,
  noseLengthMm: 80,
  bentNoseMaxDeg: 20,
  sideRoomMm: 100,
  roomAboveMm: 100,
})

const pour = () => ({
  id: 'p1',
  levelId: 'l1',
  mark: 'P1',
  thicknessMm: 220,
  concrete: 'C30/37',
  fckMPa: 30,
  coverTopMm: 25,
  coverSoffitMm: 25,
  coverEdgeMm: 30,
  outline: [
    { id: 'c1', xMm: 0, yMm: 0 },
    { id: 'c2', xMm: 12000, yMm: 0 },
    { id: 'c3', xMm: 12000, yMm: 8000 },
    { id: 'c4', xMm: 0, yMm: 8000 },
  ],
  mats: [{ id: 'm1', face: 'top', azimuthDeg: 0, diameterMm: 12, spacingMm: 200, isOuter: true }],
  stages: [
    { id: 'st1', name: 'First', share: 0.25, strengthMPa: 12 },
    { id: 'st2', name: 'Full', share: 1, strengthMPa: 24 },
  ],
})
