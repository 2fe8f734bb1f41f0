import { ENGINE_VERSION } from '@wedgeline/contract/engine-version'
import { checkReport } from './check-report'
import { fileArgument, readLayoutFile, runCommand } from './layout-file'

/** npm run -s check -- <file>: every check as JSON on stdout and nothing else there; exit 2 on bad input. */

const USAGE = 'Usage: npm run -s check -- <layout file>'

await runCommand(() => {
  const report = checkReport(readLayoutFile(fileArgument(USAGE)), ENGINE_VERSION)
  process.stdout.write(`${JSON.stringify(report, null, 1)}\n`)
})
