import { segment } from './build-jpeg'
import { ascii, joinBytes } from './bytes'

/**
 * Writes an EXIF segment by hand, so that the reader is not tested with a
 * writer of its own making. Tag numbers of CIPA DC-008, from memory.
 */
export type ExifContent = {
  orientation?: number
  dateTimeOriginal?: string
  offsetTimeOriginal?: string
  /** Degrees, minutes, seconds of latitude and longitude; north and east. */
  place?: [number[], number[]]
  maker?: string
  littleEndian?: boolean
}

type Value =
  | { kind: 'text', text: string }
  | { kind: 'short', value: number }
  | { kind: 'fractions', values: number[] }
  | { kind: 'folder', entries: Entry[] }
type Entry = { tag: number, value: Value }

const TYPES = { text: 2, short: 3, folder: 4, fractions: 5 }

export function exifSegment(content: ExifContent): Uint8Array {
  return segment(0xE1, joinBytes(ascii('Exif\0\0'), writeTiff(rootEntries(content), content.littleEndian ?? false)))
}

function rootEntries({ orientation, dateTimeOriginal, offsetTimeOriginal, place, maker }: ExifContent): Entry[] {
  const times = [text(0x9003, dateTimeOriginal), text(0x9011, offsetTimeOriginal)].flat()
  return [
    text(0x010F, maker),
    orientation === undefined ? [] : [{ tag: 0x0112, value: { kind: 'short' as const, value: orientation } }],
    times.length === 0 ? [] : [{ tag: 0x8769, value: { kind: 'folder' as const, entries: times } }],
    place ? [{ tag: 0x8825, value: { kind: 'folder' as const, entries: placeEntries(place) } }] : [],
  ].flat()
}

function placeEntries([latitude, longitude]: [number[], number[]]): Entry[] {
  return [
    ...text(1, 'N'),
    { tag: 2, value: { kind: 'fractions', values: latitude } },
    ...text(3, 'E'),
    { tag: 4, value: { kind: 'fractions', values: longitude } },
  ]
}

function text(tag: number, value: string | undefined): Entry[] {
  return value === undefined ? [] : [{ tag, value: { kind: 'text', text: `${value}\0` } }]
}

function writeTiff(root: Entry[], littleEndian: boolean): Uint8Array {
  const view = new DataView(new ArrayBuffer(4_096))
  view.setUint16(0, littleEndian ? 0x4949 : 0x4D4D)
  view.setUint16(2, 42, littleEndian)
  view.setUint32(4, 8, littleEndian)
  return new Uint8Array(view.buffer, 0, writeFolder(view, root, 8, littleEndian))
}

/** Writes a folder at `at`, what its entries point to behind it, and returns where that ends. */
function writeFolder(view: DataView, entries: Entry[], at: number, littleEndian: boolean): number {
  let free = at + 2 + entries.length * 12 + 4
  view.setUint16(at, entries.length, littleEndian)
  for (const [index, { tag, value }] of entries.entries()) {
    const entry = at + 2 + index * 12
    view.setUint16(entry, tag, littleEndian)
    view.setUint16(entry + 2, TYPES[value.kind], littleEndian)
    view.setUint32(entry + 4, countOf(value), littleEndian)
    free = writeValue(view, value, entry + 8, free, littleEndian)
  }
  return free
}

function countOf(value: Value): number {
  if (value.kind === 'text') return value.text.length
  return value.kind === 'fractions' ? value.values.length : 1
}

function writeValue(view: DataView, value: Value, field: number, free: number, littleEndian: boolean): number {
  if (value.kind === 'short') view.setUint16(field, value.value, littleEndian)
  if (value.kind === 'short') return free
  const inField = value.kind === 'text' && value.text.length <= 4
  if (!inField) view.setUint32(field, free, littleEndian)
  const at = inField ? field : free
  if (value.kind === 'folder') return writeFolder(view, value.entries, at, littleEndian)
  if (value.kind === 'text') new Uint8Array(view.buffer).set(ascii(value.text), at)
  if (value.kind === 'text') return inField ? free : free + value.text.length + value.text.length % 2
  for (const [index, number] of value.values.entries()) {
    view.setUint32(at + index * 8, Math.round(number * 100), littleEndian)
    view.setUint32(at + index * 8 + 4, 100, littleEndian)
  }
  return free + value.values.length * 8
}
