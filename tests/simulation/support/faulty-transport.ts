import { pullFeed } from '#server/services/sync/pull'
import { pushOps } from '#server/services/sync/push'
import { TemporaryFailure } from '#server/services/sync/ports'
import { ApiError } from '#server/utils/errors'
import { SYNC_SCHEMA_OLDEST } from '#shared/sync/protocol'
import type { Answer, SyncTransport } from '~/utils/offline/ports'
import type { Device, World } from './world'

/** What may happen to one request. */
export const FAULTS = [
  'none', 'drop-before', 'drop-after', '500-before', '500-after', 'duplicate', 'late', 'records-away', 'answer-lost-in-server', 'foreign-page',
] as const
export type Fault = (typeof FAULTS)[number]

/** The network between a phone and the shipped services, with the faults of a schedule, one for each request. */
export function createFaultyTransport(world: World, device: Device, faults: Fault[]): SyncTransport {
  const waiting = [...faults]

  async function send<T>(accountId: string, serve: () => Promise<T>): Promise<Answer<T>> {
    if (accountId !== device.accountId) world.wrongAccounts.push(`${device.name} sent as ${accountId}`)
    const fault = waiting.shift() ?? 'none'
    if (!device.signedIn) return { kind: 'refused', status: 401, code: 'not_signed_in', message: null, retryAfterSeconds: null }
    switch (fault) {
      case 'drop-before':
      case 'foreign-page':
        return { kind: 'unreachable' }
      case '500-before':
        return broken
      case 'late':
        world.late.push(() => answer(serve))
        return { kind: 'unreachable' }
      case 'duplicate':
        await answer(serve)
        return answer(serve)
      case 'drop-after':
        await answer(serve)
        return { kind: 'unreachable' }
      case '500-after':
        await answer(serve)
        return broken
      case 'records-away':
        world.repository.failNext('before', 1)
        return answer(serve)
      case 'answer-lost-in-server':
        world.repository.failNext('after', 1)
        return answer(serve)
      case 'none':
        return answer(serve)
    }
  }

  return {
    push: (accountId, ops) => send(accountId, async () => {
      const response = {
        results: await pushOps(world.dependencies, accountId, overTheWire(ops)),
        serverTime: world.dependencies.now().toISOString(),
        epoch: await world.repository.epoch(),
        minSchema: SYNC_SCHEMA_OLDEST,
      }
      device.pushAnswers.push(overTheWire(response))
      return overTheWire(response)
    }),
    pull: (accountId, scope, since, limit) => send(accountId, async () => {
      const response = overTheWire(await pullFeed(world.dependencies, accountId, { scope, since, limit }))
      device.pullAnswers.push({ scope, response })
      return response
    }),
  }
}

const broken = { kind: 'refused', status: 500, code: null, message: null, retryAfterSeconds: null } as const

async function answer<T>(serve: () => Promise<T>): Promise<Answer<T>> {
  try {
    return { kind: 'answered', body: await serve() }
  } catch (error) {
    if (error instanceof ApiError) {
      return { kind: 'refused', status: error.status, code: error.code, message: error.message, retryAfterSeconds: null }
    }
    if (error instanceof TemporaryFailure) return { kind: 'refused', status: 503, code: 'unavailable', message: null, retryAfterSeconds: 1 }
    throw error
  }
}

function overTheWire<T>(value: T): T {
  return JSON.parse(JSON.stringify(value))
}
