import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'
import { delimiter, join } from 'node:path'

const NAMES = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome', 'chrome']
const KNOWN = [
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
  'C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe',
]
const MISSING =
  'The browser tests need Chromium or Chrome. Install it (Debian and Ubuntu: apt-get install chromium fonts-liberation) or set CHROMIUM_PATH to its program.'

function installed() {
  const folders = (process.env.PATH ?? '').split(delimiter).concat('/usr/bin', '/usr/local/bin', '/snap/bin')
  const inPath = folders.flatMap((folder) => NAMES.map((name) => join(folder, name)))
  return [...inPath, ...KNOWN].find((path) => existsSync(path))
}

/** Debian packages its own Chromium; only root may install it. */
function installOnDebian() {
  if (process.getuid?.() !== 0 || !existsSync('/etc/debian_version')) return
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  const update = spawnSync('apt-get', ['update'], { stdio: 'inherit', env })
  if (update.status !== 0) return
  spawnSync('apt-get', ['install', '-y', '--no-install-recommends', 'chromium', 'fonts-liberation'], {
    stdio: 'inherit',
    env,
  })
}

/**
 * The browser that the tests drive: CHROMIUM_PATH, otherwise where it is usually installed, otherwise installed now.
 * @returns {string} path of its program
 * @throws Error that says what to install
 */
export function chromiumPath() {
  const asked = process.env.CHROMIUM_PATH
  if (asked) {
    if (existsSync(asked)) return asked
    throw new Error(`CHROMIUM_PATH names ${asked}, where there is no file.`)
  }
  const found = installed()
  if (found) return found
  installOnDebian()
  const now = installed()
  if (now) return now
  throw new Error(MISSING)
}

/** Start options for playwright-core's `chromium.launch`: no request of the browser's own, and root needs no sandbox. */
export function launchOptions() {
  const flags = [
    '--disable-gpu',
    '--disable-quic',
    '--no-first-run',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
    '--disable-dev-shm-usage',
  ]
  const isRoot = process.getuid?.() === 0
  return { executablePath: chromiumPath(), headless: true, args: isRoot ? ['--no-sandbox', ...flags] : flags }
}
