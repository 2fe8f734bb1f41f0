import { writeFileSync } from 'node:fs'
import { listMethods } from './methods/list-methods'

/** npm run methods: writes docs/methods.md and the data of the page "How it is checked". */

const { formulas, files } = await listMethods()
for (const { path, text } of files) writeFileSync(path, text)
process.stdout.write(`${formulas.length} formulas\n`)
