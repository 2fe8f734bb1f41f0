import type { Readable } from 'node:stream'

export interface StoredFile {
  readonly sha256: string
  readonly sizeBytes: number
}

/** Bytes by company and hash. The same bytes saved twice are one file; nothing is ever overwritten with other bytes. */
export interface FileStore {
  save(companyId: string, bytes: Uint8Array): Promise<StoredFile>
  /** @throws when there is no such file. */
  open(companyId: string, sha256: string): Promise<Readable>
}
