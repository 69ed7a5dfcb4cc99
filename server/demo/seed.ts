import { countAccounts, findAccountByEmail } from '#server/repositories/accounts'
import { createAccount } from '#server/services/accounts'
import { makeClub } from '#server/services/clubs/clubs'
import { invite } from '#server/services/clubs/invitations'
import { joinClub } from '#server/services/clubs/joining'
import { syncDependencies } from '#server/services/sync/dependencies'
import { pushOps } from '#server/services/sync/push'
import { pullFeed } from '#server/services/sync/pull'
import { accountScope, PULL_LIMIT_MAX, PUSH_OPS_MAX } from '#shared/sync/protocol'
import type { Op } from '#shared/sync/protocol'
import accounts from './accounts.json'
import { demoClub } from './content'
import { demoId } from './demo-id'
import { op, planPlant } from './plan'
import { isPhotoStored, plantPhotos } from './seed-photos'

type AccountIds = Map<string, string>

/** How long a notice counts as new in the demo. */
const NEWS_MILLISECONDS = 8 * 24 * 60 * 60 * 1_000

/**
 * Plants the demo club in an empty database, through the same services that
 * people use. Stopped in the middle, it goes on at the next start: every record
 * has an id made from its name, and what is there already is left as it is.
 */
export async function seedDemo(uploadsDir: string): Promise<void> {
  const [first] = accounts
  const begun = first && await findAccountByEmail(first.email)
  if (!begun && await countAccounts() > 0) return
  const now = new Date()
  const photoIds = demoClub.plants.flatMap(plant => planPlant(plant, '', now).photos.map(photo => photo.id))
  const last = photoIds.at(-1)
  if (begun && last && await isPhotoStored(last)) return

  say('planting the demo club, once only')
  const ids = await makeAccounts()
  const clubId = await makeDemoClub(ids)
  const plans = demoClub.plants.map(plant => planPlant(plant, clubId, now))
  for (const plan of plans) {
    await push(idOf(ids, plan.owner), plan.ops)
    for (const comment of plan.comments) await push(idOf(ids, comment.by), [comment.op], new Date(String(comment.op.fields.writtenAt)))
  }
  for (const accountId of ids.values()) await markOldNoticesSeen(accountId, now)
  const albums = plans.map(plan => ({ accountId: idOf(ids, plan.owner), photos: plan.photos }))
  await plantPhotos(albums, uploadsDir, (done, all) => say(`demo photos: ${done} of ${all}`), push)
  say('the demo club is there')
}

async function makeAccounts(): Promise<AccountIds> {
  const ids: AccountIds = new Map()
  for (const { email, displayName, password } of accounts) {
    const account = await findAccountByEmail(email) ?? await createAccount({ email, displayName, password })
    ids.set(email, account.id)
  }
  return ids
}

async function makeDemoClub(ids: AccountIds): Promise<string> {
  const dependencies = syncDependencies()
  const steward = demoClub.members.find(member => member.role === 'steward')
  const stewardId = idOf(ids, steward?.email ?? '')
  const place = await makeClub(dependencies, stewardId, { name: demoClub.name })
  for (const { email, role } of demoClub.members) {
    if (role === 'steward') continue
    const { token } = await invite(dependencies, stewardId, place.club.id, { role, usesLeft: 1 })
    await joinClub(dependencies, idOf(ids, email), token)
  }
  return place.club.id
}

/** What the demo's people would have read long ago is not news when somebody signs in as one of them. */
async function markOldNoticesSeen(accountId: string, now: Date): Promise<void> {
  const query = { scope: accountScope(accountId), since: 0, limit: PULL_LIMIT_MAX }
  const { rows } = await pullFeed(syncDependencies(), accountId, query)
  const old = rows.filter(({ type, data }) => (
    type === 'notice' && data?.seenAt === null && now.getTime() - Date.parse(String(data.at)) > NEWS_MILLISECONDS
  ))
  await push(accountId, old.map(({ id, data }) => ({
    ...op('notice', id, { seenAt: data?.at }), kind: 'patch', opId: demoId(`seen/${id}`), baseVer: 1,
  })))
}

/** @throws Error when the services refuse a record of the demo: it must be as good as anybody's */
async function push(accountId: string, ops: Op[], at?: Date): Promise<void> {
  const dependencies = at ? { ...syncDependencies(), now: () => at } : syncDependencies()
  for (let from = 0; from < ops.length; from += PUSH_OPS_MAX) {
    const results = await pushOps(dependencies, accountId, ops.slice(from, from + PUSH_OPS_MAX))
    const refused = results.find(result => result.status === 'retry' || (result.status === 'rejected' && result.code !== 'key_reused'))
    if (refused) throw new Error(`the demo could not be planted: ${JSON.stringify(refused)}`)
  }
}

function idOf(ids: AccountIds, email: string): string {
  const id = ids.get(email)
  if (!id) throw new Error(`the demo names somebody without an account: ${email}`)
  return id
}

function say(line: string): void {
  console.info(`[stillroot] ${line}`)
}
