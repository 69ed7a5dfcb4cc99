import { Op } from 'sequelize'
import { Account } from '../database/models/Account'
import { AccountSession } from '../database/models/AccountSession'

export type SessionRow = {
  sidSha256: string
  accountId: string
  device: string
  createdAt: Date
  lastSeenAt: Date
  idleUntil: Date
  absoluteUntil: Date
}

export async function insertSession(row: SessionRow): Promise<void> {
  await AccountSession.create({ ...row, revokedAt: null })
}

/** The account behind a session that is neither ended nor too old; null otherwise. */
export async function findSessionAccount(sidSha256: string, now: Date) {
  const session = await AccountSession.findOne({
    where: { sidSha256, revokedAt: null, idleUntil: { [Op.gt]: now }, absoluteUntil: { [Op.gt]: now } },
  })
  if (!session) return null
  const account = await Account.findByPk(session.accountId)
  return account ? { account: { id: account.id, displayName: account.displayName, email: account.email }, lastSeenAt: session.lastSeenAt } : null
}

export async function markSessionSeen(sidSha256: string, lastSeenAt: Date, idleUntil: Date): Promise<void> {
  await AccountSession.update({ lastSeenAt, idleUntil }, { where: { sidSha256 } })
}

export async function revokeSession(sidSha256: string, revokedAt: Date): Promise<void> {
  await AccountSession.update({ revokedAt }, { where: { sidSha256, revokedAt: null } })
}
