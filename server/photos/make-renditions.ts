import { Jimp } from 'jimp'

/**
 * What the worker is asked for. Everything it needs comes in here: it imports
 * nothing of the server, so that its chunk never drags the server into its thread.
 */
export type RenditionTask = {
  bytes: Uint8Array
  /** Longest sides to make, px, largest first: each is made from the one before. */
  sides: readonly number[]
  pixelsMax: number
}

/** One JPEG without any metadata, its longest side at most `side`. */
export type Rendition = { side: number, widthPx: number, heightPx: number, bytes: Uint8Array }

export type RenditionResult =
  | { ok: true, renditions: Rendition[] }
  /** `reason` is the decoder's own word, for the log alone. */
  | { ok: false, reason: string }

const QUALITY = 82
/** A placeholder is blurred on the screen anyway. */
const PLACEHOLDER_QUALITY = 40
const PLACEHOLDER_SIDE_MAX_PX = 32
/** 24 million points without chroma subsampling take 0.6 GB in the decoder. */
const DECODER_MEMORY_MB = 1_024
const WHITE = 0xFFFFFFFF

type Picture = Awaited<ReturnType<typeof decode>>

/** Decodes, turns upright as EXIF says, shrinks and re-encodes. Encoding anew drops EXIF, place, profiles and anything appended. */
export async function makeRenditions(task: RenditionTask): Promise<RenditionResult> {
  let picture: Picture
  try {
    picture = await decode(task)
  } catch (error) {
    return { ok: false, reason: error instanceof Error ? error.message : String(error) }
  }
  // Transparent points of a PNG would turn black in a JPEG.
  picture.background = WHITE
  const renditions: Rendition[] = []
  for (const side of task.sides) renditions.push(await shrink(picture, side))
  return { ok: true, renditions }
}

function decode({ bytes, pixelsMax }: RenditionTask) {
  return Jimp.fromBuffer(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength), {
    'image/jpeg': { maxResolutionInMP: pixelsMax / 1_000_000, maxMemoryUsageInMB: DECODER_MEMORY_MB, tolerantDecoding: false },
  })
}

async function shrink(picture: Picture, side: number): Promise<Rendition> {
  const factor = side / Math.max(picture.width, picture.height)
  if (factor < 1) {
    picture.resize({ w: Math.max(1, Math.round(picture.width * factor)), h: Math.max(1, Math.round(picture.height * factor)) })
  }
  const quality = side > PLACEHOLDER_SIDE_MAX_PX ? QUALITY : PLACEHOLDER_QUALITY
  const encoded = await picture.getBuffer('image/jpeg', { quality })
  return { side, widthPx: picture.width, heightPx: picture.height, bytes: new Uint8Array(encoded) }
}
