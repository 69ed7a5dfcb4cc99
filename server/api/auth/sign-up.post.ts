import { signUpSchema } from '#shared/domain/account.schema'
import { createAccount } from '#server/services/accounts'
import { startSession } from '#server/services/sessions'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({ auth: 'public', body: signUpSchema }, async ({ event, body }) => {
  const account = await createAccount(body)
  await startSession(event, account.id)
  return { account }
})
