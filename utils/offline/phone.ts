import { uuidV7 } from '#shared/utils/uuid'
import { sha256Hex } from '../photos/sha256'
import { httpPhotoTransport } from './http-photo-transport'
import { httpTransport } from './http-transport'
import { createIdbStorage } from './idb-storage'
import { runPhotoLane } from './photo-lane'
import { fetchMissingPictures } from './pictures'
import type { JournalStorage, Surroundings } from './ports'
import { runSyncCycle } from './sync-cycle'
import type { CycleOutcome } from './sync-cycle'
import { createSyncRunner } from './sync-runner'
import type { RunnerState, SyncRunner } from './sync-runner'
import { withTabLock } from './tab-lock'
import { watchStorage } from './watched-storage'
import type { StoreNews } from './watched-storage'

/** One account's journal on this phone. */
export type Phone = {
  accountId: string
  storage: JournalStorage
  around: Surroundings
  runner: SyncRunner
  /** Stops syncing; what is stored stays. */
  close: () => void
}

export type PhoneListener = {
  /** Something changed in the store, by this tab. */
  onNews: (news: StoreNews) => void
  /** Another tab changed these keys. */
  onOtherTab: (changedKeys: string[]) => void
  onSyncState: (state: RunnerState) => void
  /** An older tab keeps a new version of the store from opening. */
  onBlocked: () => void
}

export const surroundings: Surroundings = {
  now: () => Date.now(),
  random: () => Math.random(),
  newId: () => uuidV7(Math.max(0, Date.now()), crypto.getRandomValues(new Uint8Array(16))),
}

/** Puts an account's journal together: store, notices between tabs, and syncing. */
export function openPhone(accountId: string, listener: PhoneListener): Phone {
  const name = `stillroot-u-${accountId}`
  const channel = new BroadcastChannel(name)
  const storage = watchStorage(createIdbStorage(name, listener.onBlocked), (news) => {
    listener.onNews(news)
    channel.postMessage([...news.put.map(([key]) => key), ...news.remove])
  })
  channel.onmessage = (event) => {
    if (Array.isArray(event.data)) listener.onOtherTab(event.data.map(String))
  }
  let fetching: Promise<void> | null = null
  /** Beside the syncing, so that nobody waits for pictures to hear that all is sent. */
  const fetchPictures = () => {
    fetching ??= fetchMissingPictures({ storage }).catch(() => undefined).finally(() => {
      fetching = null
    })
  }
  const runner = createSyncRunner({
    async cycle() {
      const outcome = await textThenPhotos(storage, accountId)
      if (outcome.kind === 'done') fetchPictures()
      return outcome
    },
    around: surroundings,
    withLock: work => withTabLock(`sync:${accountId}`, work),
    setTimer(work, milliseconds) {
      const timer = setTimeout(work, milliseconds)
      return () => clearTimeout(timer)
    },
    tell: listener.onSyncState,
  })
  return {
    accountId,
    storage,
    around: surroundings,
    runner,
    close() {
      runner.close()
      channel.close()
    },
  }
}

async function textThenPhotos(storage: JournalStorage, accountId: string): Promise<CycleOutcome> {
  const text = await runSyncCycle({ storage, transport: httpTransport, around: surroundings, accountId })
  if (text.kind !== 'done') return text
  const photos = await runPhotoLane({ storage, transport: httpPhotoTransport, accountId, sha256Of: sha256Hex })
  return photos.kind === 'done' ? text : { kind: 'wait', why: 'unreachable', retryAfterSeconds: photos.retryAfterSeconds }
}
