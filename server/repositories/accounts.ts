import { isDuplicateKey } from '../database/failures'
import { Account } from '../database/models/Account'

export type AccountRow = { id: string, email: string, displayName: string, passwordHash: string, createdAt: Date }

/** False when the e-mail address is in use; then nothing was written. */
export async function insertAccount(row: AccountRow): Promise<boolean> {
  try {
    await Account.create({ ...row })
    return true
  } catch (error) {
    if (isDuplicateKey(error)) return false
    throw error
  }
}

export async function findAccountByEmail(email: string): Promise<AccountRow | null> {
  const account = await Account.findOne({ where: { email }, raw: true })
  return account ? { ...account } : null
}

export async function countAccounts(): Promise<number> {
  return Account.count()
}
