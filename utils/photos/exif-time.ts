import { JPEG_APP1, jpegSegments } from '#shared/utils/jpeg-segments'

/**
 * When a JPEG says it was taken. Reads two tags of EXIF and nothing else; its
 * place is not looked at. Whatever makes no sense counts as not stated: the
 * bytes come from anywhere.
 *
 * Source: CIPA DC-008 (Exif 2.31 and later), section 4.6, tags
 * DateTimeOriginal and OffsetTimeOriginal; numbers from memory.
 */
const TAG_EXIF_FOLDER = 0x8769
const TAG_DATE_TIME_ORIGINAL = 0x9003
const TAG_OFFSET_TIME_ORIGINAL = 0x9011
const TYPE_ASCII = 2
const ENTRY_BYTES = 12
/** A folder with more entries than any camera writes is not one. */
const ENTRIES_MAX = 512

/** As ISO 8601 in UTC. A wall time without an offset counts as this phone's own time. */
export function readTakenAt(bytes: Uint8Array): string | null {
  const tiff = findTiff(bytes)
  if (!tiff) return null
  const folder = readUint32(tiff, entryAt(tiff, firstFolder(tiff), TAG_EXIF_FOLDER), 8)
  const wallTime = readText(tiff, entryAt(tiff, folder, TAG_DATE_TIME_ORIGINAL))
  const offset = readText(tiff, entryAt(tiff, folder, TAG_OFFSET_TIME_ORIGINAL))
  return wallTime === null ? null : toInstant(wallTime, offset)
}

type Tiff = { view: DataView, littleEndian: boolean }

function findTiff(bytes: Uint8Array): Tiff | null {
  for (const { marker, start, end } of jpegSegments(bytes)) {
    const view = new DataView(bytes.buffer, bytes.byteOffset + start, end - start)
    // "Exif", two zero bytes, then the TIFF header: II or MM and the number 42.
    if (marker !== JPEG_APP1 || view.byteLength < 14 || view.getUint32(0) !== 0x45786966) continue
    const tiff = new DataView(bytes.buffer, bytes.byteOffset + start + 6, end - start - 6)
    const littleEndian = tiff.getUint16(0) === 0x4949
    if (tiff.getUint16(2, littleEndian) === 42) return { view: tiff, littleEndian }
  }
  return null
}

function firstFolder({ view, littleEndian }: Tiff): number {
  return view.getUint32(4, littleEndian)
}

/** Where the entry of a tag begins, or null when the folder has none. */
function entryAt({ view, littleEndian }: Tiff, folder: number | null, tag: number): number | null {
  if (folder === null || folder + 2 > view.byteLength) return null
  const count = Math.min(view.getUint16(folder, littleEndian), ENTRIES_MAX)
  for (let index = 0; index < count; index++) {
    const at = folder + 2 + index * ENTRY_BYTES
    if (at + ENTRY_BYTES > view.byteLength) return null
    if (view.getUint16(at, littleEndian) === tag) return at
  }
  return null
}

function readUint32({ view, littleEndian }: Tiff, entry: number | null, within: number): number | null {
  return entry === null ? null : view.getUint32(entry + within, littleEndian)
}

/** Text of up to four bytes stands in the entry itself, longer text where the entry points to. */
function readText(tiff: Tiff, entry: number | null): string | null {
  if (entry === null || tiff.view.getUint16(entry + 2, tiff.littleEndian) !== TYPE_ASCII) return null
  const length = tiff.view.getUint32(entry + 4, tiff.littleEndian)
  const at = length <= 4 ? entry + 8 : tiff.view.getUint32(entry + 8, tiff.littleEndian)
  if (length > 64 || at + length > tiff.view.byteLength) return null
  const bytes = new Uint8Array(tiff.view.buffer, tiff.view.byteOffset + at, length)
  return String.fromCharCode(...bytes).replace(/\0.*$/s, '').trim()
}

function toInstant(wallTime: string, offset: string | null): string | null {
  const match = /^(\d{4}):(\d\d):(\d\d) (\d\d):(\d\d):(\d\d)$/.exec(wallTime)
  if (!match) return null
  const [, year, month, day, hour, minute, second] = match
  const local = `${year}-${month}-${day}T${hour}:${minute}:${second}`
  // Read once as UTC: a day that the calendar lacks would otherwise slide into the next month.
  const calendar = new Date(`${local}Z`)
  if (Number.isNaN(calendar.getTime()) || !calendar.toISOString().startsWith(local)) return null
  const zone = offset && /^[+-](?:0\d|1[0-4]):[0-5]\d$/.test(offset) ? offset : ''
  return new Date(local + zone).toISOString()
}
