import { endSession } from '#server/services/sessions'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({ auth: 'public' }, async ({ event }) => {
  await endSession(event)
  return { signedOut: true }
})
