import { getHeader, sendStream, setResponseHeaders, setResponseStatus } from 'h3'
import * as z from 'zod/mini'
import { useRuntimeConfig } from '#imports'
import { idSchema } from '#shared/domain/primitives'
import { openPhoto } from '#server/services/photos'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'

const paramsSchema = z.object({ id: idSchema, width: z.string().check(z.regex(/^\d{3,4}$/)) })

export default defineRoute({ auth: 'account', params: paramsSchema }, async ({ event, account, params }) => {
  const file = await openPhoto(syncDependencies(), account.id, params.id, Number(params.width), useRuntimeConfig(event).uploadsDir)
  setResponseHeaders(event, {
    'Content-Type': 'image/jpeg',
    'Content-Disposition': `inline; filename="${params.id}.jpg"`,
    'Content-Security-Policy': 'default-src \'none\'; sandbox',
    'X-Content-Type-Options': 'nosniff',
    'ETag': file.etag,
    // Whoever may see it today may not tomorrow, so the browser asks each time.
    'Cache-Control': 'private, no-cache',
  })
  if (getHeader(event, 'if-none-match') === file.etag) {
    setResponseStatus(event, 304)
    return null
  }
  setResponseHeaders(event, { 'Content-Length': file.byteLength })
  return sendStream(event, file.open())
})
