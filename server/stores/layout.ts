import { asc, eq, and } from 'drizzle-orm'
import { LAYOUT_FORMAT, LAYOUT_VERSION, type EdgeData, type LayoutFile, type PourData } from '@wedgeline/contract'
import type { Connection } from '../../db/client'
import {
  anchor,
  barMark,
  concreteResult,
  corner,
  edge,
  edgeLength,
  edgeLine,
  gridLine,
  job,
  joint,
  level,
  matLayer,
  obstruction,
  pan,
  pour,
  region,
  stage,
  steel,
  tendon,
} from '../../db/schema'
import { hardwareOf } from './hardware'
import { ofJob, type JobKey } from './job-key'
import { jobData } from './job'
import { fromSteelRow, rowColumns } from './layout-rows'

/** Versions of the units of a layout: `edge:<id>`, `pan:<id>`, `pour:<id>`, `tendon:<id>` and `job`. */
export type Versions = Readonly<Record<string, number>>

/**
 * The layout of a job as its file would hold it, the company's hardware, jacks and strand types included.
 * Rows come in the order of their ids, which is the order in which they were made.
 * @throws when there is no such job.
 */
export function loadLayout(db: Connection, key: JobKey): LayoutFile {
  return {
    format: LAYOUT_FORMAT,
    version: LAYOUT_VERSION,
    job: jobData(db, key),
    ...hardwareOf(db, key.companyId),
    levels: db.select(rowColumns(level)).from(level).where(ofJob(level, key)).orderBy(asc(level.id)).all(),
    gridLines: db
      .select(rowColumns(gridLine))
      .from(gridLine)
      .where(ofJob(gridLine, key))
      .orderBy(asc(gridLine.id))
      .all(),
    edgeLines: db
      .select(rowColumns(edgeLine))
      .from(edgeLine)
      .where(ofJob(edgeLine, key))
      .orderBy(asc(edgeLine.id))
      .all(),
    joints: db.select(rowColumns(joint)).from(joint).where(ofJob(joint, key)).orderBy(asc(joint.id)).all(),
    obstructions: db
      .select(rowColumns(obstruction))
      .from(obstruction)
      .where(ofJob(obstruction, key))
      .orderBy(asc(obstruction.id))
      .all(),
    pours: loadPours(db, key),
    edges: loadEdges(db, key),
    pans: db.select(rowColumns(pan)).from(pan).where(ofJob(pan, key)).orderBy(asc(pan.id)).all(),
    tendons: db.select(rowColumns(tendon)).from(tendon).where(ofJob(tendon, key)).orderBy(asc(tendon.id)).all(),
    anchors: db.select(rowColumns(anchor)).from(anchor).where(ofJob(anchor, key)).orderBy(asc(anchor.id)).all(),
    steel: db
      .select(rowColumns(steel))
      .from(steel)
      .where(ofJob(steel, key))
      .orderBy(asc(steel.id))
      .all()
      .map(fromSteelRow),
    barMarks: db
      .select({ id: barMark.id, pourId: barMark.pourId, mark: barMark.mark, key: barMark.key })
      .from(barMark)
      .where(ofJob(barMark, key))
      .orderBy(asc(barMark.pourId), asc(barMark.mark))
      .all(),
    concreteResults: db
      .select(rowColumns(concreteResult))
      .from(concreteResult)
      .where(ofJob(concreteResult, key))
      .orderBy(asc(concreteResult.id))
      .all(),
  }
}

function loadPours(db: Connection, key: JobKey): PourData[] {
  const parts = <T extends { pourId: string }>(rows: T[]) => byOwner(rows, (row) => row.pourId)
  const outlines = parts(
    db.select(rowColumns(corner)).from(corner).where(ofJob(corner, key)).orderBy(asc(corner.position)).all(),
  )
  const regions = parts(
    db.select(rowColumns(region)).from(region).where(ofJob(region, key)).orderBy(asc(region.position)).all(),
  )
  const mats = parts(
    db.select(rowColumns(matLayer)).from(matLayer).where(ofJob(matLayer, key)).orderBy(asc(matLayer.position)).all(),
  )
  const stages = parts(
    db.select(rowColumns(stage)).from(stage).where(ofJob(stage, key)).orderBy(asc(stage.position)).all(),
  )
  const rows = db.select(rowColumns(pour)).from(pour).where(ofJob(pour, key)).orderBy(asc(pour.id)).all()
  return rows.map((row) => ({
    ...row,
    outline: (outlines.get(row.id) ?? []).map(({ pourId: _, ...part }) => part),
    regions: (regions.get(row.id) ?? []).map(({ pourId: _, ...part }) => part),
    mats: (mats.get(row.id) ?? []).map(({ pourId: _, ...part }) => part),
    stages: (stages.get(row.id) ?? []).map(({ pourId: _, ...part }) => part),
  }))
}

function loadEdges(db: Connection, key: JobKey): EdgeData[] {
  const lengths = byOwner(
    db
      .select(rowColumns(edgeLength))
      .from(edgeLength)
      .where(ofJob(edgeLength, key))
      .orderBy(asc(edgeLength.position))
      .all(),
    (row) => row.edgeId,
  )
  const rows = db.select(rowColumns(edge)).from(edge).where(ofJob(edge, key)).orderBy(asc(edge.id)).all()
  return rows.map((row) => ({
    ...row,
    lengths: (lengths.get(row.id) ?? []).map(({ edgeId: _, ...part }) => part),
  }))
}

function byOwner<T>(rows: readonly T[], ownerOf: (row: T) => string): Map<string, T[]> {
  const lists = new Map<string, T[]>()
  for (const row of rows) {
    const list = lists.get(ownerOf(row))
    if (list) list.push(row)
    else lists.set(ownerOf(row), [row])
  }
  return lists
}

export function loadVersions(db: Connection, key: JobKey): Versions {
  const own = db
    .select({ version: job.layoutVersion })
    .from(job)
    .where(and(eq(job.companyId, key.companyId), eq(job.id, key.jobId)))
    .get()
  const versions: Record<string, number> = { job: own?.version ?? 0 }
  const units = { pour, edge, pan, tendon }
  for (const [name, table] of Object.entries(units)) {
    const rows = db.select({ id: table.id, version: table.version }).from(table).where(ofJob(table, key)).all()
    for (const { id, version } of rows) versions[`${name}:${id}`] = version
  }
  return versions
}
