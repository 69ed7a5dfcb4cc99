import { PHOTO_BYTES_MAX, PHOTO_PIXELS_MAX } from '#shared/domain/photo.schema'
import { ApiError } from '#server/utils/errors'

const SAFE = 'The text of your entry is safe.'
const BYTES_MAX_MB = PHOTO_BYTES_MAX / 1024 / 1024
const PIXELS_MAX_MP = PHOTO_PIXELS_MAX / 1_000_000

/** The body is no form, or a form without exactly one file named `photo`. */
export function photoFormUnreadable(): ApiError {
  return new ApiError({ status: 400, code: 'photo_form_unreadable', message: `The photo did not arrive in a form the server can read. ${SAFE} Send the photo again.` })
}

export function photoEmpty(): ApiError {
  return new ApiError({ status: 400, code: 'photo_empty', message: `An empty file arrived instead of a photo. ${SAFE} Pick the photo again.` })
}

export function photoTooLarge(): ApiError {
  return new ApiError({ status: 413, code: 'photo_too_large', message: `This photo is larger than ${BYTES_MAX_MB} MB. ${SAFE} Pick the photo again: the app makes it smaller before it sends it.` })
}

export function photoTooManyPixels(widthPx: number, heightPx: number): ApiError {
  return new ApiError({ status: 413, code: 'photo_too_many_pixels', message: `This photo has ${widthPx} × ${heightPx} points; the server opens up to ${PIXELS_MAX_MP} million. ${SAFE} Pick the photo again: the app makes it smaller before it sends it.` })
}

export function photoNotAPicture(): ApiError {
  return new ApiError({ status: 415, code: 'photo_not_a_picture', message: `This file is not a picture. ${SAFE} Pick a photo instead.` })
}

export function photoTypeUnsupported(typeName: string): ApiError {
  return new ApiError({ status: 415, code: 'photo_type_unsupported', message: `The server opens JPEG and PNG; this picture is ${typeName}. ${SAFE} Pick the photo again in the app, which turns it into a JPEG.` })
}

export function photoHeic(): ApiError {
  return new ApiError({ status: 415, code: 'photo_heic', message: `This photo is in the HEIC format, which the server cannot open. ${SAFE} Set the camera to save JPEG (on many phones: Settings, Camera, Formats, Most compatible), or share the photo as JPEG, and pick it again.` })
}

export function photoChecksumMismatch(): ApiError {
  return new ApiError({ status: 422, code: 'photo_checksum_mismatch', message: `The photo changed on its way and was not kept. ${SAFE} The copy on this phone is still there; send it again.` })
}

export function photoCutOff(): ApiError {
  return new ApiError({ status: 422, code: 'photo_cut_off', message: `Part of this photo is missing, so it cannot be opened. ${SAFE} Pick the photo again, or take a new one.` })
}

export function photoUndecodable(): ApiError {
  return new ApiError({ status: 422, code: 'photo_undecodable', message: `This photo is damaged and cannot be opened. ${SAFE} Pick the photo again, or take a new one.` })
}

export function photoTookTooLong(): ApiError {
  return new ApiError({ status: 422, code: 'photo_took_too_long', message: `Opening this photo took too long, so the server stopped. ${SAFE} Send the photo again; if it happens twice, pick a smaller one.` })
}

export function photosBusy(): ApiError {
  return new ApiError({ status: 503, code: 'photos_busy', message: `Many photos are arriving at the moment. ${SAFE} The copy on this phone is kept and is sent again later.`, retryAfterSeconds: 20 })
}
