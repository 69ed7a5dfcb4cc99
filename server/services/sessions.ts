import { randomBytes } from 'node:crypto'
import { getCookie, getHeader } from 'h3'
import type { H3Event } from 'h3'
import { clearUserSession, getUserSession, setUserSession } from '#auth-server/session'
import { useRuntimeConfig } from '#imports'
import type { Account } from '#shared/domain/account.schema'
import { SHORT_TEXT_MAX } from '#shared/domain/primitives'
import { findSessionAccount, insertSession, markSessionSeen, revokeSession } from '../repositories/sessions'
import { sha256Of } from '../utils/sha256'

const DAY = 24 * 60 * 60 * 1_000
/** A session that nobody used for so long ends. */
const IDLE_MILLISECONDS = 30 * DAY
/** A session ends after so long however much it is used. */
const ABSOLUTE_MILLISECONDS = 90 * DAY
/** How stale "last seen" may be before it is written again. */
const SEEN_MILLISECONDS = 10 * 60 * 1_000

/**
 * Starts a session. The sealed cookie holds a new random number and nothing
 * else; the number's checksum is in the table, where the session can be ended.
 */
export async function startSession(event: H3Event, accountId: string): Promise<void> {
  await endSession(event)
  const sid = randomBytes(32).toString('base64url')
  const now = new Date()
  await insertSession({
    sidSha256: sha256Of(sid),
    accountId,
    device: (getHeader(event, 'user-agent') ?? 'unknown device').slice(0, SHORT_TEXT_MAX),
    createdAt: now,
    lastSeenAt: now,
    idleUntil: new Date(now.getTime() + IDLE_MILLISECONDS),
    absoluteUntil: new Date(now.getTime() + ABSOLUTE_MILLISECONDS),
  })
  await setUserSession(event, { secure: { sid } })
}

/** Ends the session of this request, in the table first. */
export async function endSession(event: H3Event): Promise<void> {
  const sid = await sidOf(event)
  if (!sid) return
  await revokeSession(sha256Of(sid), new Date())
  await clearUserSession(event)
}

/** Who sends this request; null without a session that is still good. */
export async function accountOfRequest(event: H3Event): Promise<Account | null> {
  const sid = await sidOf(event)
  if (!sid) return null
  const now = new Date()
  const sidSha256 = sha256Of(sid)
  const found = await findSessionAccount(sidSha256, now)
  if (!found) return null
  if (now.getTime() - found.lastSeenAt.getTime() > SEEN_MILLISECONDS) {
    await markSessionSeen(sidSha256, now, new Date(now.getTime() + IDLE_MILLISECONDS))
  }
  return found.account
}

/**
 * Without a session cookie the module is not asked: it would answer with an
 * empty cookie, and a slow answer to a request sent before somebody signed in
 * would then put that over the cookie of the new session.
 */
async function sidOf(event: H3Event): Promise<string | null> {
  const { name } = useRuntimeConfig(event).session
  if (!name || !getCookie(event, name)) return null
  const { secure } = await getUserSession(event)
  const sid: unknown = secure && 'sid' in secure ? secure.sid : null
  return typeof sid === 'string' ? sid : null
}
