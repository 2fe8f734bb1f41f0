import { toEngine } from '@wedgeline/contract'
import { ENGINE_VERSION } from '@wedgeline/contract/engine-version'
import { proposeSteel, type Layout, type Pour } from '@wedgeline/engine'
import { fileArgument, readLayoutFile, runCommand } from './layout-file'

/** npm run -s propose -- <file>: bars for every pour as JSON on stdout, the file left as it is; exit 2 on bad input. */

const USAGE = 'Usage: npm run -s propose -- <layout file>'

await runCommand(() => {
  const { layout } = readLayoutFile(fileArgument(USAGE))
  const engineLayout = toEngine(layout)
  const report = {
    format: 'wedgeline.proposal',
    version: 1,
    engineVersion: ENGINE_VERSION,
    note: 'Results assist a qualified engineer and do not replace one. Local codes and licensed practice govern.',
    units: 'Dimensions in mm, masses in kg.',
    pours: engineLayout.pours.map((pour) => pourReport(engineLayout, pour)),
  }
  process.stdout.write(`${JSON.stringify(report, null, 1)}\n`)
})

function pourReport(layout: Layout, { id, mark }: Pour) {
  const { zones, mass, marks, curve, isExact, notes } = proposeSteel(layout, { pourId: id })
  return {
    pour: mark,
    mass,
    marks,
    curve,
    isExact,
    notes,
    zones: zones.map(({ zone, place, removes, adds, massOld, massNew, before, after, blocked, notes: said }) => ({
      zone: zone.name,
      ...{ zoneId: zone.id, place, removes, adds, massOld, massNew, before, after, blocked, notes: said },
    })),
  }
}
