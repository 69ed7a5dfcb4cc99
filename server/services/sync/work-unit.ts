import type { Op } from '#shared/sync/protocol'
import type { FieldChange } from '#shared/sync/merge'
import type { NoticeCode } from '#shared/domain/notice.schema'
import { accountScope } from '#shared/sync/protocol'
import type { ChangeKind, FeedRef, StoredRecord, SyncDependencies } from './ports'

type Author = { accountId: string, deviceId: string, opId: string | null }

/**
 * Stands in the history where a phone's own id would: changes that a person
 * makes by a request of its own, such as leaving a club, come from no phone's
 * outbox. No phone has this id (theirs are random and of version 7), so that
 * every phone takes such a change for somebody else's.
 */
export const SERVER_DEVICE_ID = '00000000-0000-4000-8000-000000000001'

/**
 * Everything one operation writes. Each write raises the record's version,
 * adds a line to its history and is told to every feed that may see it; the
 * feeds are written last, all at once, so that a record stands in each only once.
 */
export class WorkUnit {
  private readonly told = new Map<string, Map<string, FeedRef>>()

  constructor(
    private readonly dependencies: SyncDependencies,
    private readonly author: Author,
  ) {}

  static ofOp(dependencies: SyncDependencies, accountId: string, op: Op): WorkUnit {
    return new WorkUnit(dependencies, { accountId, deviceId: op.deviceId, opId: op.opId })
  }

  static ofServer(dependencies: SyncDependencies, accountId: string): WorkUnit {
    return new WorkUnit(dependencies, { accountId, deviceId: SERVER_DEVICE_ID, opId: null })
  }

  get at(): string {
    return this.dependencies.now().toISOString()
  }

  async insert(record: StoredRecord, scopes: string[]): Promise<void> {
    await this.dependencies.repository.insert(record)
    const fields = Object.fromEntries(Object.entries(record.data).map(([field, to]) => [field, { from: null, to }]))
    await this.writeHistory(record, 'create', fields)
    this.tell(scopes, [record])
  }

  /** Writes `record` with these fields changed; returns it with its new version. */
  async update(
    record: StoredRecord, kind: ChangeKind, changes: Record<string, unknown>, scopes: string[], deleted = record.deleted,
  ): Promise<StoredRecord> {
    const next: StoredRecord = { ...record, ver: record.ver + 1, deleted, data: { ...record.data, ...changes } }
    const fields: Record<string, FieldChange> = {}
    for (const [field, to] of Object.entries(changes)) fields[field] = { from: record.data[field] ?? null, to }
    await this.dependencies.repository.update(next)
    await this.writeHistory(next, kind, fields)
    this.tell(scopes, [next])
    return next
  }

  async notify(code: NoticeCode, accountIds: string[], about: Partial<Record<'plantId' | 'entryId', unknown>>, subjectId: string): Promise<void> {
    for (const accountId of new Set(accountIds)) {
      await this.insert({
        type: 'notice',
        id: this.dependencies.newId(),
        ver: 1,
        deleted: false,
        data: {
          accountId,
          code,
          plantId: about.plantId ?? null,
          entryId: about.entryId ?? null,
          subjectId,
          byAccountId: this.author.accountId,
          at: this.at,
          seenAt: null,
        },
      }, [accountScope(accountId)])
    }
  }

  /** A record that is told again moves to the end: whatever is below it comes first. */
  tell(scopes: string[], refs: FeedRef[]): void {
    for (const scope of scopes) {
      const rows = this.told.get(scope) ?? new Map<string, FeedRef>()
      for (const { type, id, ver } of refs) {
        rows.delete(`${type}/${id}`)
        rows.set(`${type}/${id}`, { type, id, ver })
      }
      this.told.set(scope, rows)
    }
  }

  /** Writes the feeds, in sorted order. Call once, last. */
  async close(): Promise<void> {
    for (const scope of [...this.told.keys()].sort()) {
      await this.dependencies.repository.appendFeed(scope, [...this.told.get(scope)?.values() ?? []])
    }
  }

  private async writeHistory(record: StoredRecord, kind: ChangeKind, fields: Record<string, FieldChange>): Promise<void> {
    await this.dependencies.repository.appendChange({
      entityType: record.type,
      entityId: record.id,
      ver: record.ver,
      kind,
      fields,
      at: this.at,
      ...this.author,
    })
  }
}
