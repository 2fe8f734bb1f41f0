import { v7 as uuidv7 } from 'uuid'
import type { EdgeData, LayoutFile, PourData, SteelZoneData } from '@wedgeline/contract'

/** New id by old id, for one kind of row. */
type Ids = ReadonlyMap<string, string>

/** Ids that rows of the company have already, by the id that the file gives them; the others get new ones. */
export interface KnownIds {
  readonly jobId: string
  readonly strandTypes: Ids
  readonly jacks: Ids
  readonly hardware: Ids
}

/**
 * The same layout under new ids: two files may use one id, and two imports of one file are two jobs. References are
 * kept; ids count up in the order of the rows, so that the order stays. Corners, stages, mats, regions and lengths of
 * different pours and edges may share an id in the file and get one each.
 * @throws where a reference names nothing; layouts with such a reference are refused before.
 */
export function renewIds(file: LayoutFile, known: KnownIds): LayoutFile {
  const maps = {
    level: freshIds(file.levels),
    edgeLine: freshIds(file.edgeLines),
    joint: freshIds(file.joints),
    pour: freshIds(file.pours),
    edge: freshIds(file.edges),
    pan: freshIds(file.pans),
    tendon: freshIds(file.tendons),
    anchor: freshIds(file.anchors),
  }
  const at: At = (kind, id) => idIn(maps[kind], id)
  const corners = new Map(file.pours.map((pour) => [pour.id, freshIds(pour.outline)]))
  const renewed = { at, corners, known }
  return {
    ...file,
    job: { ...file.job, id: known.jobId },
    ...renewHardware(file, known),
    ...renewPlaces(file, renewed),
    ...renewTendons(file, renewed),
  }
}

type Kind = 'level' | 'edgeLine' | 'joint' | 'pour' | 'edge' | 'pan' | 'tendon' | 'anchor'
type At = (kind: Kind, id: string) => string

interface Renewed {
  readonly at: At
  /** Ids of the corners of each pour, by the pour's old id. */
  readonly corners: ReadonlyMap<string, Ids>
  readonly known: KnownIds
}

function renewHardware(file: LayoutFile, known: KnownIds) {
  return {
    strandTypes: file.strandTypes.map((row) => ({ ...row, id: idIn(known.strandTypes, row.id) })),
    jacks: file.jacks.map((row) => ({ ...row, id: idIn(known.jacks, row.id) })),
    hardware: file.hardware.map((row) => ({
      ...row,
      id: idIn(known.hardware, row.id),
      jackId: orNull(row.jackId, (id) => idIn(known.jacks, id)),
    })),
  }
}

function renewPlaces(file: LayoutFile, renewed: Renewed) {
  const { at, known } = renewed
  return {
    levels: file.levels.map((row) => ({ ...row, id: at('level', row.id) })),
    gridLines: file.gridLines.map(withFreshId),
    edgeLines: file.edgeLines.map((row) => ({ ...row, id: at('edgeLine', row.id), levelId: at('level', row.levelId) })),
    joints: file.joints.map((row) => ({
      ...row,
      id: at('joint', row.id),
      edgeLineId: at('edgeLine', row.edgeLineId),
      firstPourId: at('pour', row.firstPourId),
    })),
    obstructions: file.obstructions.map((row) => ({ ...withFreshId(row), levelId: at('level', row.levelId) })),
    pours: file.pours.map((row) => renewPour(row, renewed)),
    edges: file.edges.map((row) => renewEdge(row, renewed)),
    pans: file.pans.map((row) => ({
      ...row,
      id: at('pan', row.id),
      pourId: at('pour', row.pourId),
      jackId: orNull(row.jackId, (id) => idIn(known.jacks, id)),
    })),
  }
}

function renewTendons(file: LayoutFile, { at, known }: Renewed) {
  const inPour = <T extends { readonly id: string; readonly pourId: string }>(row: T): T => ({
    ...withFreshId(row),
    pourId: at('pour', row.pourId),
  })
  return {
    tendons: file.tendons.map((row) => ({
      ...row,
      id: at('tendon', row.id),
      pourId: at('pour', row.pourId),
      strandTypeId: idIn(known.strandTypes, row.strandTypeId),
    })),
    anchors: file.anchors.map((row) => ({
      ...row,
      id: at('anchor', row.id),
      tendonId: at('tendon', row.tendonId),
      edgeId: orNull(row.edgeId, (id) => at('edge', id)),
      panId: orNull(row.panId, (id) => at('pan', id)),
      hardwareId: idIn(known.hardware, row.hardwareId),
      castWithPourId: at('pour', row.castWithPourId),
      stressedWithPourId: at('pour', row.stressedWithPourId),
    })),
    steel: file.steel.map((row) => ({ ...inPour(row), zone: renewZone(row.zone, at) })),
    barMarks: file.barMarks.map(inPour),
    concreteResults: file.concreteResults.map(inPour),
  }
}

const orNull = (id: string | null, renew: (id: string) => string): string | null => (id === null ? null : renew(id))

function renewPour(pour: PourData, { at, corners }: Renewed): PourData {
  const own = corners.get(pour.id) ?? new Map()
  return {
    ...pour,
    id: at('pour', pour.id),
    levelId: at('level', pour.levelId),
    outline: pour.outline.map((corner) => ({ ...corner, id: idIn(own, corner.id) })),
    regions: pour.regions.map(withFreshId),
    mats: pour.mats.map(withFreshId),
    stages: pour.stages.map(withFreshId),
  }
}

const renewEdge = (edge: EdgeData, { at, corners }: Renewed): EdgeData => ({
  ...edge,
  id: at('edge', edge.id),
  pourId: at('pour', edge.pourId),
  edgeLineId: at('edgeLine', edge.edgeLineId),
  cornerId: idIn(corners.get(edge.pourId) ?? new Map(), edge.cornerId),
  lengths: edge.lengths.map(withFreshId),
})

function renewZone(zone: SteelZoneData, at: At): SteelZoneData {
  switch (zone.kind) {
    case 'anchor':
      return { ...zone, anchorId: at('anchor', zone.anchorId) }
    case 'gap':
      return {
        ...zone,
        edgeId: at('edge', zone.edgeId),
        afterAnchorId: orNull(zone.afterAnchorId, (id) => at('anchor', id)),
        beforeAnchorId: orNull(zone.beforeAnchorId, (id) => at('anchor', id)),
      }
    case 'edge':
      return { ...zone, edgeId: at('edge', zone.edgeId) }
    case 'pan':
      return { ...zone, panId: at('pan', zone.panId) }
    case 'joint':
      return { ...zone, jointId: at('joint', zone.jointId) }
  }
}

const freshIds = (rows: readonly { readonly id: string }[]): Ids => new Map(rows.map(({ id }) => [id, uuidv7()]))

const withFreshId = <T extends { readonly id: string }>(row: T): T => ({ ...row, id: uuidv7() })

function idIn(ids: Ids, id: string): string {
  const found = ids.get(id)
  if (found === undefined) throw new Error(`The layout names "${id}", which it does not hold.`)
  return found
}
