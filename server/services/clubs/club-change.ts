import type { ClubAct } from '#server/policies/clubs'
import { mayInClub } from '#server/policies/clubs'
import { notAllowed, notFound } from '#server/utils/errors'
import type { SyncDependencies } from '../sync/ports'
import { WorkUnit } from '../sync/work-unit'

/**
 * Carries out a change to a club in one transaction. It holds the named feeds
 * first; every change to a club holds the club's feed, so what is read inside
 * stays true until the commit. `work` may run again after a deadlock.
 */
export async function changeClub<T>(
  dependencies: SyncDependencies, actorId: string, feeds: string[], work: (unit: WorkUnit) => Promise<T>,
): Promise<T> {
  const { repository } = dependencies
  return repository.transaction(async () => {
    await repository.lockScopes([...new Set(feeds)].sort())
    const unit = WorkUnit.ofServer(dependencies, actorId)
    const outcome = await work(unit)
    await unit.close()
    return outcome
  })
}

/** @throws ApiError not_found for who is no member, not_allowed for a member without the role */
export async function requireMay(dependencies: SyncDependencies, act: ClubAct, clubId: string, accountId: string): Promise<void> {
  const verdict = mayInClub(act, await dependencies.repository.roleIn(clubId, accountId))
  if (verdict === 'not_found') throw notFound()
  if (verdict === 'not_allowed') throw notAllowed()
}
