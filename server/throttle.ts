import { createHash } from 'node:crypto'
import { write, type Connection, type Db, type Tx } from '../db/client'
import { throttled } from './failure'
import { countBack, countOf, countUp, forget, forgetOld } from './stores/rate-limit'

/**
 * Holds back guessing of passwords without shutting the owner out for good: after some free attempts each next one has
 * to wait, at most a minute. Attempts that come too early are neither checked nor counted. Counts lie in the database,
 * so that they hold over a restart and for every server process.
 */

const MINUTE_MS = 60_000
const KNOWN_FOR_MS = 30 * 24 * 60 * MINUTE_MS

interface Limit {
  readonly kind: 'pair' | 'account' | 'address' | 'reset' | 'reset-address'
  readonly freeAttempts: number
  readonly windowMs: number
}

/** One account from one address. */
const PAIR: Limit = { kind: 'pair', freeAttempts: 5, windowMs: 15 * MINUTE_MS }
/** One account from all addresses that its owner has not yet signed in from: guessing from many machines. */
const ACCOUNT: Limit = { kind: 'account', freeAttempts: 20, windowMs: 60 * MINUTE_MS }
/** All accounts from one address: one password tried on many people. */
const ADDRESS: Limit = { kind: 'address', freeAttempts: 50, windowMs: 15 * MINUTE_MS }

/** Links for a forgotten password, to one address and from one machine. */
const RESETS: readonly Limit[] = [
  { kind: 'reset', freeAttempts: 3, windowMs: 60 * MINUTE_MS },
  { kind: 'reset-address', freeAttempts: 20, windowMs: 60 * MINUTE_MS },
]

export interface Attempt {
  readonly email: string
  readonly address: string
  readonly nowMs: number
}

/**
 * Counts an attempt before it is checked, so that a hundred at once are not all free.
 * @throws Failure that says how long to wait.
 */
export function countAttempt(db: Db, attempt: Attempt): void {
  countUnder(db, attempt, (tx) => {
    // An address that the owner has signed in from is not held back by what others do elsewhere.
    const isKnown = countOf(tx, keyOf('known', attempt), attempt.nowMs) !== null
    return isKnown ? [PAIR] : [PAIR, ACCOUNT, ADDRESS]
  })
}

/**
 * Counts a link for a forgotten password that is asked for, whoever has the address.
 * @throws Failure that says how long to wait.
 */
export const countReset = (db: Db, attempt: Attempt): void => countUnder(db, attempt, () => RESETS)

function countUnder(db: Db, attempt: Attempt, limitsIn: (tx: Tx) => readonly Limit[]): void {
  const { nowMs } = attempt
  const waitMs = write(db, (tx) => {
    const limits = limitsIn(tx)
    const longestMs = Math.max(...limits.map((limit) => waitOf(tx, limit, attempt)))
    if (longestMs > 0) return longestMs
    forgetOld(tx, nowMs)
    for (const { kind, windowMs } of limits) countUp(tx, keyOf(kind, attempt), { nowMs, windowMs })
    return 0
  })
  if (waitMs === 0) return
  const waitS = Math.ceil(waitMs / 1000)
  throw throttled(`Too many attempts. Try again in ${waitS} s.`, waitS)
}

/** The owner got in: this address is known to them from now on. */
export function noteSuccess(db: Db, attempt: Attempt): void {
  write(db, (tx) => {
    // Only what this attempt had counted: signing in to an own account must not wipe out guesses at others.
    const isKnown = countOf(tx, keyOf('known', attempt), attempt.nowMs) !== null
    if (!isKnown) for (const kind of ['account', 'address'] as const) countBack(tx, keyOf(kind, attempt))
    forget(tx, keyOf('pair', attempt))
    countUp(tx, keyOf('known', attempt), { nowMs: attempt.nowMs, windowMs: KNOWN_FOR_MS })
  })
}

/** Waits of 1, 2, 4 ... 60 s once the free attempts are used up, from the last attempt on. */
function waitOf(db: Connection, limit: Limit, attempt: Attempt): number {
  const found = countOf(db, keyOf(limit.kind, attempt), attempt.nowMs)
  if (!found || found.count < limit.freeAttempts) return 0
  const lastAtMs = found.windowEndAtMs - limit.windowMs
  const waitMs = Math.min(1000 * 2 ** (found.count - limit.freeAttempts), MINUTE_MS)
  return lastAtMs + waitMs - attempt.nowMs
}

/** Hashed, so that the table holds neither addresses of people nor of machines. */
function keyOf(kind: Limit['kind'] | 'known', { email, address }: Attempt): string {
  const parts = partsOf(kind, email, networkOf(address))
  return `${kind}:${createHash('sha256').update(parts.join('\n')).digest('hex')}`
}

function partsOf(kind: Limit['kind'] | 'known', email: string, network: string): string[] {
  switch (kind) {
    case 'account':
    case 'reset':
      return [email]
    case 'address':
    case 'reset-address':
      return [network]
    case 'pair':
    case 'known':
      return [email, network]
  }
}

/** An IPv6 address stands for its /64: one household or machine has the whole of it. IPv4 stands for itself. */
export function networkOf(address: string): string {
  const plain = address.toLowerCase().replace(/^::ffff:(?=\d+\.\d+\.\d+\.\d+$)/, '')
  if (!plain.includes(':')) return plain
  const [head = '', tail] = plain.split('::')
  const front = head === '' ? [] : head.split(':')
  const back = tail === undefined || tail === '' ? [] : tail.split(':')
  const zeros = tail === undefined ? 0 : Math.max(0, 8 - front.length - back.length)
  const groups = [...front, ...Array.from({ length: zeros }, () => '0'), ...back]
  return `${groups
    .slice(0, 4)
    .map((group) => group.replace(/^0+(?=.)/, ''))
    .join(':')}::/64`
}
