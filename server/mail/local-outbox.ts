import { mkdir, rename, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { createTransport } from 'nodemailer'
import { v7 as uuidv7 } from 'uuid'
import type { Mailer } from './mailer'

const FROM = 'Wedgeline <wedgeline@localhost>'

/**
 * Mail that goes nowhere: each message becomes a file in `folder` that any mail program opens. Names begin with the
 * time, so that a listing is in order; `onStored` is told each. No network is touched.
 */
export function localOutbox(folder: string, onStored: (path: string) => void = () => undefined): Mailer {
  const transport = createTransport({ streamTransport: true, buffer: true, newline: 'windows' })
  return {
    async send(message) {
      const sent = await transport.sendMail({ from: FROM, ...message })
      await mkdir(folder, { recursive: true, mode: 0o700 })
      const path = join(folder, `${uuidv7()}.eml`)
      // Links that let somebody in are in here: for the owner of the folder alone.
      await writeFile(`${path}.part`, sent.message, { mode: 0o600 })
      await rename(`${path}.part`, path)
      onStored(path)
    },
  }
}
