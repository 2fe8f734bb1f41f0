import type { LayoutFile } from '../layout'
import { refused, type Path, type Problem } from './problem'

/** Ids that name nothing of the kind that is asked for. */
export function referenceProblems(layout: LayoutFile): Problem[] {
  const find = finder(layout)
  return [
    ...layout.hardware.flatMap((row, i) => find.maybe('jacks', row.jackId, ['hardware', i, 'jackId'])),
    ...layout.edgeLines.flatMap((row, i) => find.one('levels', row.levelId, ['edgeLines', i, 'levelId'])),
    ...layout.joints.flatMap((row, i) => [
      ...find.one('edgeLines', row.edgeLineId, ['joints', i, 'edgeLineId']),
      ...find.one('pours', row.firstPourId, ['joints', i, 'firstPourId']),
    ]),
    ...layout.obstructions.flatMap((row, i) => find.one('levels', row.levelId, ['obstructions', i, 'levelId'])),
    ...layout.pours.flatMap((row, i) => find.one('levels', row.levelId, ['pours', i, 'levelId'])),
    ...layout.edges.flatMap((row, i) => [
      ...find.one('pours', row.pourId, ['edges', i, 'pourId']),
      ...find.one('edgeLines', row.edgeLineId, ['edges', i, 'edgeLineId']),
    ]),
    ...layout.pans.flatMap((row, i) => [
      ...find.one('pours', row.pourId, ['pans', i, 'pourId']),
      ...find.maybe('jacks', row.jackId, ['pans', i, 'jackId']),
    ]),
    ...layout.tendons.flatMap((row, i) => [
      ...find.one('pours', row.pourId, ['tendons', i, 'pourId']),
      ...find.one('strandTypes', row.strandTypeId, ['tendons', i, 'strandTypeId']),
    ]),
    ...layout.anchors.flatMap((row, i) => anchorReferences(row, ['anchors', i], find)),
    ...layout.steel.flatMap((row, i) => steelReferences(row, ['steel', i], find)),
    ...layout.barMarks.flatMap((row, i) => find.one('pours', row.pourId, ['barMarks', i, 'pourId'])),
    ...layout.concreteResults.flatMap((row, i) => find.one('pours', row.pourId, ['concreteResults', i, 'pourId'])),
  ]
}

const KINDS = {
  levels: 'level',
  strandTypes: 'strand type',
  jacks: 'jack',
  hardware: 'hardware',
  edgeLines: 'edge line',
  joints: 'joint',
  pours: 'pour',
  edges: 'edge',
  pans: 'pan',
  tendons: 'tendon',
  anchors: 'anchor',
} as const
type Kind = keyof typeof KINDS

interface Finder {
  one(kind: Kind, id: string, path: Path): Problem[]
  maybe(kind: Kind, id: string | null, path: Path): Problem[]
}

function finder(layout: LayoutFile): Finder {
  const ids = new Map(Object.keys(KINDS).map((kind) => [kind, new Set(layout[kind as Kind].map((row) => row.id))]))
  const one = (kind: Kind, id: string, path: Path): Problem[] =>
    ids.get(kind)?.has(id)
      ? []
      : [refused(path, `"${id}" is no ${KINDS[kind]} of this file; must be the id of a row in ${kind}`)]
  return { one, maybe: (kind, id, path) => (id === null ? [] : one(kind, id, path)) }
}

function anchorReferences(anchor: LayoutFile['anchors'][number], path: Path, find: Finder): Problem[] {
  return [
    ...find.one('tendons', anchor.tendonId, [...path, 'tendonId']),
    ...find.maybe('edges', anchor.edgeId, [...path, 'edgeId']),
    ...find.maybe('pans', anchor.panId, [...path, 'panId']),
    ...find.one('hardware', anchor.hardwareId, [...path, 'hardwareId']),
    ...find.one('pours', anchor.castWithPourId, [...path, 'castWithPourId']),
    ...find.one('pours', anchor.stressedWithPourId, [...path, 'stressedWithPourId']),
  ]
}

function steelReferences({ pourId, zone }: LayoutFile['steel'][number], path: Path, find: Finder): Problem[] {
  return [...find.one('pours', pourId, [...path, 'pourId']), ...zoneReferences(zone, [...path, 'zone'], find)]
}

function zoneReferences(zone: LayoutFile['steel'][number]['zone'], path: Path, find: Finder): Problem[] {
  switch (zone.kind) {
    case 'anchor':
      return find.one('anchors', zone.anchorId, [...path, 'anchorId'])
    case 'gap':
      return [
        ...find.one('edges', zone.edgeId, [...path, 'edgeId']),
        ...find.maybe('anchors', zone.afterAnchorId, [...path, 'afterAnchorId']),
        ...find.maybe('anchors', zone.beforeAnchorId, [...path, 'beforeAnchorId']),
      ]
    case 'edge':
      return find.one('edges', zone.edgeId, [...path, 'edgeId'])
    case 'pan':
      return find.one('pans', zone.panId, [...path, 'panId'])
    case 'joint':
      return find.one('joints', zone.jointId, [...path, 'jointId'])
  }
}
