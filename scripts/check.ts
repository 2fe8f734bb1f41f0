import { parseArgs } from 'node:util'
import { ENGINE_VERSION } from '@wedgeline/contract/engine-version'
import { checkReport } from './check-report'
import { InputError, readLayoutFile, runCommand } from './layout-file'

/** npm run -s check -- <file>: every check as JSON on stdout and nothing else there; exit 2 on bad input. */

const USAGE = 'Usage: npm run -s check -- <layout file>'

await runCommand(() => {
  const report = checkReport(readLayoutFile(fileArgument()), ENGINE_VERSION)
  process.stdout.write(`${JSON.stringify(report, null, 1)}\n`)
})

function fileArgument(): string {
  try {
    const { positionals } = parseArgs({ allowPositionals: true, options: {} })
    const [path, ...more] = positionals
    if (path !== undefined && more.length === 0) return path
  } catch (error) {
    throw new InputError(`${error instanceof Error ? error.message : String(error)}\n${USAGE}`)
  }
  throw new InputError(`file: must be given once\n${USAGE}`)
}
