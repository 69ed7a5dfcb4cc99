import { randomBytes } from 'node:crypto'
import type { Account, SignIn, SignUp } from '#shared/domain/account.schema'
import { uuidV7 } from '#shared/utils/uuid'
import { findAccountByEmail, insertAccount } from '../repositories/accounts'
import { emailTaken, wrongCredentials } from '../utils/errors'
import { hashOf, passwordMatches } from './passwords'

/** @throws ApiError email_taken */
export async function createAccount(request: SignUp): Promise<Account> {
  const email = normalisedEmail(request.email)
  const account = {
    id: uuidV7(Date.now(), randomBytes(16)),
    email,
    displayName: request.displayName.trim(),
  }
  const passwordHash = await hashOf(request.password)
  if (!await insertAccount({ ...account, passwordHash, createdAt: new Date() })) throw emailTaken()
  return account
}

/** @throws ApiError wrong_credentials, in the same time whether the account exists or not */
export async function checkCredentials(request: SignIn): Promise<Account> {
  const row = await findAccountByEmail(normalisedEmail(request.email))
  if (!await passwordMatches(row?.passwordHash ?? null, request.password) || !row) throw wrongCredentials()
  return { id: row.id, email: row.email, displayName: row.displayName }
}

function normalisedEmail(email: string): string {
  return email.trim().toLowerCase()
}
