/** Why a chosen file cannot become a photo. */
export type PhotoProblemCode = 'unreadable' | 'not-a-picture' | 'heic' | 'too-large' | 'out-of-memory' | 'damaged' | 'not-encoded'

const SAFE = 'What you wrote is safe.'
const MESSAGES: Record<PhotoProblemCode, string> = {
  'unreadable': `This phone could not read the file. ${SAFE} If the photo is kept online, open it once in your gallery so that it is downloaded, then pick it again.`,
  'not-a-picture': `This file is not a picture. ${SAFE} Pick a photo instead.`,
  'heic': `This photo is in the HEIC format, which this browser cannot open. ${SAFE} Share or save it as JPEG and pick that copy, or set the camera to save JPEG (on many phones: Settings, Camera, Formats, Most compatible).`,
  'too-large': `This picture is too large for a phone to open. ${SAFE} Pick a smaller copy of it.`,
  'out-of-memory': `This phone has too little memory free to prepare the photo. ${SAFE} Close other apps, then pick the photo again.`,
  'damaged': `This photo is damaged and cannot be opened. ${SAFE} Pick it again, or take a new one.`,
  'not-encoded': `This browser could not save the photo as a JPEG. ${SAFE} Try another browser, or pick another photo.`,
}

/** Its message is a sentence for the person in front of the screen. */
export class PhotoProblem extends Error {
  readonly code: PhotoProblemCode

  constructor(code: PhotoProblemCode, cause?: unknown) {
    super(MESSAGES[code], { cause })
    this.name = 'PhotoProblem'
    this.code = code
  }
}
