import { and, asc, eq } from 'drizzle-orm'
import type { HardwareData, JackData, LayoutFile, StrandTypeData } from '@wedgeline/contract'
import type { Connection } from '../../db/client'
import { approvalStrength, hardware, jack, strandType } from '../../db/schema'
import { created, updated, type Stamp } from './job-key'
import { rowColumns } from './layout-rows'

/** What a company presses and bears on: hardware, jacks and types of strand, the same for all its jobs. */
export type CompanyHardware = Pick<LayoutFile, 'hardware' | 'jacks' | 'strandTypes'>

export function hardwareOf(db: Connection, companyId: string): CompanyHardware {
  return {
    strandTypes: db
      .select(rowColumns(strandType))
      .from(strandType)
      .where(eq(strandType.companyId, companyId))
      .orderBy(asc(strandType.id))
      .all(),
    jacks: db.select(rowColumns(jack)).from(jack).where(eq(jack.companyId, companyId)).orderBy(asc(jack.id)).all(),
    hardware: loadHardware(db, companyId),
  }
}

function loadHardware(db: Connection, companyId: string): HardwareData[] {
  const strengths = db
    .select()
    .from(approvalStrength)
    .where(eq(approvalStrength.companyId, companyId))
    .orderBy(asc(approvalStrength.position))
    .all()
  const rows = db.select().from(hardware).where(eq(hardware.companyId, companyId)).orderBy(asc(hardware.id)).all()
  return rows.map((row) =>
    fromRow(
      row,
      strengths.filter(({ hardwareId }) => hardwareId === row.id),
    ),
  )
}

type HardwareRow = typeof hardware.$inferSelect
type StrengthRow = typeof approvalStrength.$inferSelect

function fromRow(row: HardwareRow, strengths: readonly StrengthRow[]): HardwareData {
  const { approvalReference, holeWidthMm, holeHeightMm, holeIsRound } = row
  const { pocketWidthMm, pocketHeightMm, pocketDepthMm } = row
  return {
    id: row.id,
    name: row.name,
    description: row.description,
    kind: row.kind,
    ends: row.ends,
    strandsMax: row.strandsMax,
    approval:
      approvalReference === null
        ? null
        : {
            reference: approvalReference,
            strengths: strengths.map(({ companyId: _c, hardwareId: _h, position: _p, ...strength }) => strength),
          },
    plate: { widthMm: row.plateWidthMm, heightMm: row.plateHeightMm },
    hole:
      holeWidthMm === null || holeHeightMm === null || holeIsRound === null
        ? null
        : { widthMm: holeWidthMm, heightMm: holeHeightMm, isRound: holeIsRound },
    duct: { widthMm: row.ductWidthMm, heightMm: row.ductHeightMm, isRound: row.ductIsRound },
    pocket:
      pocketWidthMm === null || pocketHeightMm === null || pocketDepthMm === null
        ? null
        : { widthMm: pocketWidthMm, heightMm: pocketHeightMm, depthMm: pocketDepthMm },
    deviceLengthMm: row.deviceLengthMm,
    splayLengthMm: row.splayLengthMm,
    transmissionLengthMm: row.transmissionLengthMm,
    spacingAlongMinMm: row.spacingAlongMinMm,
    spacingHeightMinMm: row.spacingHeightMinMm,
    edgeAlongMinMm: row.edgeAlongMinMm,
    edgeHeightMinMm: row.edgeHeightMinMm,
    straightBehindMinMm: row.straightBehindMinMm,
    strandTailMinMm: row.strandTailMinMm,
    drawInMm: row.drawInMm,
    localSteel: row.localSteel,
    jackId: row.jackId,
  }
}

function toRow({ approval, plate, hole, duct, pocket, ...row }: HardwareData) {
  return {
    ...row,
    approvalReference: approval?.reference ?? null,
    plateWidthMm: plate.widthMm,
    plateHeightMm: plate.heightMm,
    holeWidthMm: hole?.widthMm ?? null,
    holeHeightMm: hole?.heightMm ?? null,
    holeIsRound: hole?.isRound ?? null,
    ductWidthMm: duct.widthMm,
    ductHeightMm: duct.heightMm,
    ductIsRound: duct.isRound,
    pocketWidthMm: pocket?.widthMm ?? null,
    pocketHeightMm: pocket?.heightMm ?? null,
    pocketDepthMm: pocket?.depthMm ?? null,
  }
}

export interface CompanyStamp extends Stamp {
  readonly companyId: string
}

/** Inserts the hardware, or changes the company's hardware of that id. */
export function putHardware(db: Connection, data: HardwareData, { companyId, ...stamp }: CompanyStamp): void {
  const row = toRow(data)
  db.insert(hardware)
    .values({ companyId, ...row, ...created(stamp) })
    .onConflictDoUpdate({ target: [hardware.companyId, hardware.id], set: { ...row, ...updated(stamp) } })
    .run()
  db.delete(approvalStrength)
    .where(and(eq(approvalStrength.companyId, companyId), eq(approvalStrength.hardwareId, data.id)))
    .run()
  const strengths = data.approval?.strengths ?? []
  for (const [position, strength] of strengths.entries()) {
    db.insert(approvalStrength)
      .values({ companyId, hardwareId: data.id, position, ...strength })
      .run()
  }
}

export function putJack(db: Connection, row: JackData, { companyId, ...stamp }: CompanyStamp): void {
  db.insert(jack)
    .values({ companyId, ...row, ...created(stamp) })
    .onConflictDoUpdate({ target: [jack.companyId, jack.id], set: { ...row, ...updated(stamp) } })
    .run()
}

export function putStrandType(db: Connection, row: StrandTypeData, { companyId, ...stamp }: CompanyStamp): void {
  db.insert(strandType)
    .values({ companyId, ...row, ...created(stamp) })
    .onConflictDoUpdate({ target: [strandType.companyId, strandType.id], set: { ...row, ...updated(stamp) } })
    .run()
}
