/** Places in a zip file (APPNOTE 6.3): records by signature, little-endian. */
const END = { signature: 0x06054b50, size: 22, count: 10, directory: 16 }
const ENTRY = { signature: 0x02014b50, size: 46, time: 12, name: 28, extra: 30, comment: 32, local: 42 }
const LOCAL = { signature: 0x04034b50, time: 10 }
/** 1 January 1980, 0:00, the first time that a zip file can hold: date above time. */
const FIRST_TIME = 0x00210000

/**
 * Sets the time of every entry to the first that a zip file can hold, in place, so that the same contents are the same
 * bytes whenever they are written.
 *
 * @throws where the bytes are no zip file.
 */
export function withoutTimes(zip: Buffer): Buffer {
  const end = zip.length - END.size
  if (end < 0 || zip.readUInt32LE(end) !== END.signature) throw new Error('The workbook is no zip file.')
  let at = zip.readUInt32LE(end + END.directory)
  for (let left = zip.readUInt16LE(end + END.count); left > 0; left--) {
    const local = zip.readUInt32LE(at + ENTRY.local)
    if (zip.readUInt32LE(at) !== ENTRY.signature || zip.readUInt32LE(local) !== LOCAL.signature) {
      throw new Error('The workbook is no zip file.')
    }
    zip.writeUInt32LE(FIRST_TIME, at + ENTRY.time)
    zip.writeUInt32LE(FIRST_TIME, local + LOCAL.time)
    const more = [ENTRY.name, ENTRY.extra, ENTRY.comment].reduce((sum, place) => sum + zip.readUInt16LE(at + place), 0)
    at += ENTRY.size + more
  }
  return zip
}
