import { useRuntimeConfig } from '#imports'
import * as z from 'zod/mini'
import { idSchema } from '#shared/domain/primitives'
import { acceptPhotoBytes } from '#server/services/photos'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({
  auth: 'account', actingAccount: true, params: z.object({ id: idSchema }),
}, ({ event, account, params }) => (
  acceptPhotoBytes(syncDependencies(), account.id, params.id, event.node.req, useRuntimeConfig(event).uploadsDir)
))
