import { overlay } from '#shared/sync/overlay'
import type { OverlaidRecord } from '#shared/sync/overlay'
import type { ChangeRequest } from '#shared/sync/outbox'
import { accountScope, clubScope } from '#shared/sync/protocol'
import type { Op, PullResponse, PushResponse, RecordType } from '#shared/sync/protocol'
import type { SyncDependencies } from '#server/services/sync/ports'
import { WorkUnit } from '#server/services/sync/work-unit'
import { keys, prefixes } from '~/utils/offline/keys'
import { saveChanges } from '~/utils/offline/journal'
import { StorageFull } from '~/utils/offline/ports'
import { readAttention, readBases, readOutbox } from '~/utils/offline/stored-shapes'
import { runSyncCycle } from '~/utils/offline/sync-cycle'
import type { CycleOutcome } from '~/utils/offline/sync-cycle'
import { watchStorage } from '~/utils/offline/watched-storage'
import { createMemoryStorage } from '../../support/memory-storage'
import { createMemorySyncRepository } from '../../support/memory-sync-repository'
import { createFaultyTransport } from './faulty-transport'
import type { Fault } from './faulty-transport'
import { entryFields } from './entry-fields'
import { countingIds, START } from './ids'

/** An operation whose save on the phone completed, and what its writer saw. */
export type LedgerLine = {
  op: Op
  device: Device
  shown: Record<string, unknown> | null
  /** Comments on the record that stood on the screen. */
  comments: string[]
}

export type Device = {
  name: string
  accountId: string
  storage: ReturnType<typeof watchStorage>
  fillOnce: () => void
  clockOffset: number
  signedIn: boolean
  /** What happened to versions on this device. */
  versionsThatWentBack: string[]
  pullAnswers: { scope: string, response: PullResponse }[]
  pushAnswers: PushResponse[]
}

/** A full phone refuses the whole step; the step comes to nothing and the phone goes on. */
export async function unlessFull<T>(work: () => Promise<T>): Promise<T | 'store'> {
  try {
    return await work()
  } catch (error) {
    if (error instanceof StorageFull) return 'store'
    throw error
  }
}

/** Two people, three phones, one server: everything that is shipped but the network and the disks. */
export class World {
  readonly newId = countingIds()
  readonly repository = createMemorySyncRepository()
  readonly ledger: LedgerLine[] = []
  readonly faultsReported: unknown[] = []
  readonly wrongAccounts: string[] = []
  late: (() => Promise<unknown>)[] = []
  now = START
  restored = false
  readonly grower = this.newId()
  readonly mentor = this.newId()
  readonly club = this.newId()
  plantId = ''
  readonly devices: Device[] = [
    this.makeDevice('grower’s phone', this.grower),
    this.makeDevice('grower’s tablet', this.grower),
    this.makeDevice('mentor’s phone', this.mentor),
  ]

  readonly dependencies: SyncDependencies = {
    repository: this.repository,
    now: () => new Date(this.now),
    newId: this.newId,
    reportFault: error => this.faultsReported.push(error),
  }

  /** A club of both, and a shared plant that every device has seen. */
  async begin(): Promise<void> {
    const unit = new WorkUnit(this.dependencies, { accountId: this.grower, deviceId: this.newId(), opId: null })
    const scopes = [clubScope(this.club)]
    await this.repository.transaction(async () => {
      await unit.insert({ type: 'club', id: this.club, ver: 1, deleted: false, data: { name: 'Roof' } }, scopes)
      for (const accountId of [this.grower, this.mentor]) {
        const data = { clubId: this.club, accountId, displayName: 'Somebody', role: accountId === this.mentor ? 'mentor' : 'steward' }
        await unit.insert({ type: 'membership', id: this.newId(), ver: 1, deleted: false, data }, [...scopes, accountScope(accountId)])
      }
      await unit.close()
    })
    const [first] = this.devices
    if (!first) throw new Error('a world needs a device')
    this.plantId = this.newId()
    await this.save(first, { kind: 'create', entityType: 'plant', entityId: this.plantId, fields: this.plantFields() })
    await this.save(first, { kind: 'create', entityType: 'entry', entityId: this.newId(), fields: entryFields(this) })
    await this.heal()
  }

  /** A person saves a change. Only what the phone has completed goes into the ledger. */
  async save(device: Device, request: ChangeRequest): Promise<void> {
    this.now += 1_000
    const shown = (await this.view(device, request.entityType, request.entityId))?.data ?? null
    const comments = (await this.visible(device, 'comment')).filter(comment => comment.data.entryId === request.entityId).map(comment => comment.id)
    const saved = await unlessFull(() => saveChanges(device.storage, this.around(device), [request]))
    if (saved !== 'store') this.ledger.push(...saved.map(op => ({ op, device, shown, comments })))
  }

  /** One round, as the runner starts it: a store that is full ends the round, and the next one tries again. */
  async sync(device: Device, faults: Fault[]): Promise<CycleOutcome | 'store'> {
    this.now += 5_000
    const transport = createFaultyTransport(this, device, faults)
    return unlessFull(() => runSyncCycle({ storage: device.storage, transport, around: this.around(device), accountId: device.accountId }))
  }

  /** Everything works again: late requests arrive, everybody signs in, all devices sync until nothing moves. */
  async heal(): Promise<void> {
    for (const deliver of this.late.splice(0)) await deliver()
    this.repository.failNext('before', 0)
    this.repository.failNext('after', 0)
    for (const device of this.devices) device.signedIn = true
    for (let round = 0; round < 4; round += 1) {
      for (const device of this.devices) await this.sync(device, [])
    }
  }

  async view(device: Device, type: RecordType, id: string): Promise<OverlaidRecord | null> {
    const snapshot = await device.storage.read({ keys: [keys.base(type, id)], prefixes: [prefixes.outbox, prefixes.attention, prefixes.base] })
    const base = readBases(snapshot).find(record => record.type === type && record.id === id) ?? null
    const ofIt = ({ op }: { op: Op }) => op.entityId === id
    return overlay(base, readOutbox(snapshot).filter(ofIt).map(item => item.op), readAttention(snapshot).filter(ofIt).map(item => item.op), device.accountId)
  }

  /** Records of one kind that a device shows just now, in a steady order. */
  async visible(device: Device, type: RecordType): Promise<OverlaidRecord[]> {
    const snapshot = await device.storage.read({ prefixes: [prefixes.base, prefixes.outbox] })
    const ids = new Set([
      ...readBases(snapshot).filter(base => base.type === type).map(base => base.id),
      ...readOutbox(snapshot).filter(({ op }) => op.entityType === type).map(({ op }) => op.entityId),
    ])
    const views = await Promise.all([...ids].sort().map(id => this.view(device, type, id)))
    return views.filter(view => view !== null)
  }

  around(device: Device) {
    return { now: () => this.now + device.clockOffset, random: () => 0.5, newId: this.newId }
  }

  plantFields(): Record<string, unknown> {
    return {
      name: 'Juniper', cropId: 'tomato', cultivar: null, origin: null, sownOn: null, setUpOn: '2026-05-01', timeZone: 'Europe/Lisbon',
      vesselId: null, place: null, visibility: 'club', clubId: this.club, endedOn: null, endReason: null,
    }
  }

  private makeDevice(name: string, accountId: string): Device {
    const memory = createMemoryStorage()
    const device: Device = {
      name, accountId, storage: memory, fillOnce: memory.fillOnce, clockOffset: 0, signedIn: true, versionsThatWentBack: [], pullAnswers: [], pushAnswers: [],
    }
    const versions = new Map<string, number>()
    device.storage = watchStorage(memory, ({ put }) => {
      for (const [key, value] of put) {
        if (!key.startsWith(prefixes.base) || typeof value !== 'object' || value === null || !('ver' in value)) continue
        const version = Number(value.ver)
        const former = versions.get(key) ?? 0
        if (version < former && !this.restored) device.versionsThatWentBack.push(`${name} ${key}: ${former} → ${version}`)
        versions.set(key, version)
      }
    })
    return device
  }
}
