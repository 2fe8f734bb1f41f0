import { getTableColumns } from 'drizzle-orm'
import type { SQLiteColumn, SQLiteTable } from 'drizzle-orm/sqlite-core'
import type { LayoutFile, Row, SteelData, SteelZoneData } from '@wedgeline/contract'
import {
  anchor,
  concreteResult,
  corner,
  edge,
  edgeLength,
  edgeLine,
  gridLine,
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

/** Which table holds which rows of a layout, and how a row of the contract lies in it. */

/** Columns that the store keeps for itself. */
const KEPT = [
  'companyId',
  'jobId',
  'version',
  'position',
  'createdAtMs',
  'createdBy',
  'updatedAtMs',
  'updatedBy',
] as const
type Kept = (typeof KEPT)[number]
type Columns<T extends SQLiteTable> = T['_']['columns']

/** The columns of a table that belong to the contract's row. */
export function rowColumns<T extends SQLiteTable>(table: T): Omit<Columns<T>, Kept> {
  const columns: Record<string, SQLiteColumn> = getTableColumns(table)
  const own = Object.entries(columns).filter(([key]) => !KEPT.some((kept) => kept === key))
  return Object.fromEntries(own) as Omit<Columns<T>, Kept>
}

/** A table of the layout: with company, job and id. */
export type LayoutTable = SQLiteTable & { companyId: SQLiteColumn; jobId: SQLiteColumn; id: SQLiteColumn }

/** A table whose rows a row of the contract holds as an ordered list. */
export interface PartTable {
  readonly table: LayoutTable
  /** Key of the list in the contract's row. */
  readonly list: string
  /** Column that names the row which holds the list. */
  readonly owner: string
}

export interface Home {
  readonly table: LayoutTable
  /** Lists that lie in tables of their own. */
  readonly parts: readonly PartTable[]
  /** Name of the unit whose version the table carries; null where it carries none. */
  readonly unit: string | null
}

const plain = (table: LayoutTable, unit: string | null = null): Home => ({ table, parts: [], unit })

/** Every editable table of the contract, in an order in which what is pointed at comes first. */
export const HOMES = {
  levels: plain(level),
  gridLines: plain(gridLine),
  edgeLines: plain(edgeLine),
  obstructions: plain(obstruction),
  pours: {
    table: pour,
    parts: [
      { table: corner, list: 'outline', owner: 'pourId' },
      { table: region, list: 'regions', owner: 'pourId' },
      { table: matLayer, list: 'mats', owner: 'pourId' },
      { table: stage, list: 'stages', owner: 'pourId' },
    ],
    unit: 'pour',
  },
  joints: plain(joint),
  edges: { table: edge, parts: [{ table: edgeLength, list: 'lengths', owner: 'edgeId' }], unit: 'edge' },
  pans: plain(pan, 'pan'),
  tendons: plain(tendon, 'tendon'),
  anchors: plain(anchor),
  steel: plain(steel),
  concreteResults: plain(concreteResult),
} as const satisfies Record<Exclude<keyof LayoutFile, NotEditable>, Home>

type NotEditable = 'format' | 'version' | 'job' | 'strandTypes' | 'jacks' | 'hardware' | 'barMarks'

export type SteelRow = Omit<SteelData, 'zone'> & {
  readonly zoneKind: SteelZoneData['kind']
  readonly anchorId: string | null
  readonly edgeId: string | null
  readonly afterAnchorId: string | null
  readonly beforeAnchorId: string | null
  readonly panId: string | null
  readonly jointId: string | null
}

const NO_ZONE = { anchorId: null, edgeId: null, afterAnchorId: null, beforeAnchorId: null, panId: null, jointId: null }

function toSteelRow({ zone, ...row }: SteelData): SteelRow {
  const { kind, ...place } = zone
  return { ...row, ...NO_ZONE, zoneKind: kind, ...place }
}

/** @throws on a row whose columns do not fit its kind of zone; the table's CHECKs keep those out. */
export function fromSteelRow(row: SteelRow): SteelData {
  const { id, pourId, shape, source, isLocked } = row
  return { id, pourId, zone: zoneOf(row), shape, source, isLocked }
}

function zoneOf(row: SteelRow): SteelZoneData {
  const { zoneKind: kind, afterAnchorId, beforeAnchorId } = row
  switch (kind) {
    case 'anchor':
      return { kind, anchorId: there(row.anchorId) }
    case 'gap':
      return { kind, edgeId: there(row.edgeId), afterAnchorId, beforeAnchorId }
    case 'edge':
      return { kind, edgeId: there(row.edgeId) }
    case 'pan':
      return { kind, panId: there(row.panId) }
    case 'joint':
      return { kind, jointId: there(row.jointId) }
  }
}

function there(id: string | null): string {
  if (id === null) throw new Error('A row of steel names no place for its kind of zone.')
  return id
}

/** A contract's row as the columns of its own table; lists that lie in tables of their own are left out. */
export function toColumns(name: keyof typeof HOMES, row: Row): Record<string, unknown> {
  if (name === 'steel') return { ...toSteelRow(row as SteelData) }
  const lists = HOMES[name].parts.map((part) => part.list)
  return Object.fromEntries(Object.entries(row).filter(([key]) => !lists.includes(key)))
}
