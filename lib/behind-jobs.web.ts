/** What the build writes into the page: the script of what several parts behind the jobs share. */
const NAMED = 'meta[name="wedgeline-shared-script"]'

let shared: Promise<void> | null = null

/**
 * Loads a part of the product that lies behind the jobs, after the script that it shares with other parts.
 * @throws where that script cannot be fetched; the next call tries again.
 */
export async function behindJobs<T>(load: () => Promise<T>): Promise<T> {
  shared ??= sharedScript()
  try {
    await shared
  } catch (error) {
    shared = null
    throw error
  }
  return load()
}

function sharedScript(): Promise<void> {
  const address = document.querySelector(NAMED)?.getAttribute('content')
  if (!address) return Promise.resolve()
  return new Promise((resolve, reject) => {
    const script = document.createElement('script')
    script.src = address
    script.addEventListener('load', () => resolve())
    script.addEventListener('error', () => {
      script.remove()
      reject(new Error(`The script ${address} could not be fetched.`))
    })
    document.head.append(script)
  })
}
