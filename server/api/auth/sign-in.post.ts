import { signInSchema } from '#shared/domain/account.schema'
import { checkCredentials } from '#server/services/accounts'
import { startSession } from '#server/services/sessions'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({ auth: 'public', body: signInSchema }, async ({ event, body }) => {
  const account = await checkCredentials(body)
  await startSession(event, account.id)
  return { account }
})
