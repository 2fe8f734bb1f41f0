import { spawn } from 'node:child_process'
import { constants } from 'node:os'
import { build } from './build.mjs'
import { install } from './install.mjs'
import { ROOT } from './project.mjs'

/** Serves until a signal comes. Node runs the server itself: a signal sent to npx would not reach it. */
function serve() {
  const server = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], { cwd: ROOT, stdio: 'inherit' })
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      // A terminal sends Ctrl-C to the whole group, so the server already has it.
      if (signal === 'SIGINT' && process.stdin.isTTY) return
      server.kill(signal)
    })
  }
  server.on('error', (error) => {
    console.error(`The server could not be started: ${error.message}`)
    process.exit(1)
  })
  server.on('exit', (code, signal) => process.exit(code ?? 128 + (signal ? constants.signals[signal] : 0)))
}

try {
  await install()
  const code = await build()
  if (code !== 0) throw new Error(`Building the web client failed (exit code ${code}); its message stands above.`)
  serve()
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 1
}
