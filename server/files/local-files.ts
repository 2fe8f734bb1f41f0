import { createHash } from 'node:crypto'
import { Disk } from 'flydrive'
import { FSDriver } from 'flydrive/drivers/fs'
import { v7 as uuidv7 } from 'uuid'
import type { FileStore } from './file-store'

/** Files in a folder of this machine, under company/sha256. `folder` is made on the first write. */
export function localFiles(folder: string): FileStore {
  const disk = new Disk(new FSDriver({ location: folder, visibility: 'private' }))
  return {
    async save(companyId, bytes) {
      const sha256 = createHash('sha256').update(bytes).digest('hex')
      const key = `${companyId}/${sha256}`
      if (!(await disk.exists(key))) {
        // Written aside and moved, so that a kill in mid-write leaves no half file under its final name.
        const aside = `${companyId}/unfinished-${uuidv7()}`
        await disk.put(aside, bytes)
        await disk.move(aside, key)
      }
      return { sha256, sizeBytes: bytes.byteLength }
    },
    open: (companyId, sha256) => disk.getStream(`${companyId}/${sha256}`),
  }
}
