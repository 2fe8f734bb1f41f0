import { readFileSync, statSync } from 'node:fs'
import { parseArgs } from 'node:util'
import { readLayoutText, type LayoutFile, type Problem } from '@wedgeline/contract'

/** Bad input from the command line; the message says what would be right. */
export class InputError extends Error {
  override readonly name = 'InputError'
}

export interface LayoutOnDisk {
  readonly layout: LayoutFile
  /** Stops: kept as typed. */
  readonly problems: readonly Problem[]
}

/** Largest layout file that is read, in bytes; 20,000 anchors with their tendons take about 20 MB. */
const SIZE_MAX = 100_000_000

/**
 * Reads a layout file.
 * @throws InputError where the file is not there or is no layout; each line of its message names the field.
 */
export function readLayoutFile(path: string): LayoutOnDisk {
  const read = readLayoutText(textOf(path))
  if (read.ok) return read
  const lines = read.problems.filter(({ severity }) => severity === 'refused')
  throw new InputError(lines.map(({ field, message }) => `${field}: ${message}`).join('\n'))
}

function textOf(path: string): string {
  try {
    const { size } = statSync(path)
    if (size > SIZE_MAX) throw new InputError(`file: has ${size} bytes; must have at most ${SIZE_MAX}`)
    return readFileSync(path, 'utf8')
  } catch (error) {
    if (error instanceof InputError) throw error
    const why = error instanceof Error ? error.message : String(error)
    throw new InputError(`file: cannot be read (${why}); must be the path of a layout file`)
  }
}

/** The one argument of a command that takes a layout file and nothing else. @throws InputError with `usage` otherwise. */
export function fileArgument(usage: string): string {
  try {
    const { positionals } = parseArgs({ allowPositionals: true, options: {} })
    const [path, ...more] = positionals
    if (path !== undefined && more.length === 0) return path
  } catch (error) {
    throw new InputError(`${error instanceof Error ? error.message : String(error)}\n${usage}`)
  }
  throw new InputError(`file: must be given once\n${usage}`)
}

/** Runs a command: bad input goes to stderr with exit 2; anything else that is thrown is a fault of the program. */
export async function runCommand(command: () => void | Promise<void>): Promise<void> {
  try {
    await command()
  } catch (error) {
    if (!(error instanceof InputError)) throw error
    process.stderr.write(`${error.message}\n`)
    process.exitCode = 2
  }
}
