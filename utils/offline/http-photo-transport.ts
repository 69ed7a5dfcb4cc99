import * as z from 'zod/mini'
import { RECORD_TYPES } from '#shared/sync/protocol'
import { ask } from './http-transport'
import type { PhotoTransport } from './photo-lane'

const recordSchema = z.object({
  type: z.enum(RECORD_TYPES),
  id: z.string(),
  ver: z.int(),
  state: z.enum(['live', 'deleted', 'revoked']),
  data: z.nullable(z.record(z.string(), z.unknown())),
})

/** Sends one picture as a form with one file, under the photo's own id. */
export const httpPhotoTransport: PhotoTransport = {
  upload(accountId, photoId, sha256, bytes) {
    const form = new FormData()
    form.append('photo', new Blob([bytes], { type: 'image/jpeg' }), `${sha256}.jpg`)
    return ask(`/api/photos/${photoId}/content`, accountId, recordSchema, { method: 'PUT', body: form })
  },
}
