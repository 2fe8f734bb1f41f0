import { crc32, deflateSync } from 'node:zlib'

/** A grey picture: 0 is black, 255 white, row by row from the top. */
export interface GreyPicture {
  readonly width: number
  readonly height: number
  readonly pixels: Uint8Array
}

const SIGNATURE = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])

/** A picture as a PNG file (ISO/IEC 15948): 8 bits of grey, no filter; the same picture gives the same bytes. */
export function png({ width, height, pixels }: GreyPicture): Buffer {
  const head = Buffer.alloc(13)
  head.writeUInt32BE(width, 0)
  head.writeUInt32BE(height, 4)
  // Bit depth 8, colour type 0 (grey), deflate, no filter methods but the one, not interlaced.
  head.set([8, 0, 0, 0, 0], 8)
  const rows = Buffer.alloc((width + 1) * height)
  for (let y = 0; y < height; y++) rows.set(pixels.subarray(y * width, (y + 1) * width), y * (width + 1) + 1)
  return Buffer.concat([
    SIGNATURE,
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(rows)),
    chunk('IEND', Buffer.alloc(0)),
  ])
}

function chunk(type: string, data: Buffer): Buffer {
  const named = Buffer.concat([Buffer.from(type, 'latin1'), data])
  const length = Buffer.alloc(4)
  length.writeUInt32BE(data.length)
  const check = Buffer.alloc(4)
  check.writeUInt32BE(crc32(named))
  return Buffer.concat([length, named, check])
}
