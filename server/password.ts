import { hash, verify } from '@node-rs/argon2'
import { COMMON_PASSWORDS } from './common-passwords-table'
import { refused } from './failure'

/** Argon2id (the package's default kind), 19 MiB, 2 passes, 1 lane: the smallest set that OWASP's cheat sheet names. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

/**
 * Hash of a password that nobody has, at the same cost. An unknown address is checked against it, so that the answer
 * takes as long as for a known one.
 */
const NOBODY = hash(`nobody ${Math.random()}`, COST)

export const hashPassword = (password: string): Promise<string> => hash(password, COST)

/** @throws Failure for a password that anybody would try. */
export async function newPasswordHash(password: string, email: string): Promise<string> {
  if (isObvious(password, email)) {
    throw refused('This password is among the first that anybody would try. Take a longer or odder one.', 'password')
  }
  return hashPassword(password)
}

/** Whether the password is the one hashed; false, after as long a time, when there is no hash. */
export async function isPassword(passwordHash: string | null, password: string): Promise<boolean> {
  const isRight = await verify(passwordHash ?? (await NOBODY), password)
  return isRight && passwordHash !== null
}

/** Whether a password is among the first that anybody would try: the list, one sign repeated, the person's own address. */
export function isObvious(password: string, email: string): boolean {
  const plain = password.trim().toLowerCase()
  const [name = ''] = email.split('@')
  return COMMON_PASSWORDS.has(plain) || /^(.)\1*$/u.test(plain) || plain === email || plain === name
}
