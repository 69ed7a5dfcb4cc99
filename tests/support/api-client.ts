/**
 * A phone without a screen: keeps its cookies, sends what a browser sends with a request of the app's own
 * pages, and makes operations with rising numbers.
 */
import { randomBytes } from 'node:crypto'
import type { Account } from '#shared/domain/account.schema'
import type { FeedRow, Op, OpKind, OpResult, PullResponse, RecordType } from '#shared/sync/protocol'
import { accountScope, clubScope } from '#shared/sync/protocol'
import { uuidV7 } from '#shared/utils/uuid'
import { validComment, validEntry, validPlant, validVessel } from './valid-fields'

export const PASSWORD = 'a long enough password'

export function newId(): string {
  return uuidV7(Date.now(), randomBytes(16))
}

// The answer's shape is what the tests are about, so they read it without a type.
// eslint-disable-next-line @typescript-eslint/no-explicit-any
export type Answer<Body = any> = { status: number, body: Body, headers: Headers }

export type Sent = { body?: unknown, raw?: string, headers?: Record<string, string | null> }

export class ApiClient {
  private lastSeq = 0
  account: Account = { id: '', displayName: '', email: '' }

  constructor(
    readonly origin: string,
    readonly deviceId = newId(),
    private readonly cookies = new Map<string, string>(),
  ) {}

  /** Another phone of the same person, in the same session. */
  otherPhone(): ApiClient {
    const phone = new ApiClient(this.origin, newId(), this.cookies)
    phone.account = this.account
    return phone
  }

  get userFeed(): string { return accountScope(this.account.id) }

  get cookie(): string { return [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; ') }

  async call(method: string, path: string, sent: Sent = {}): Promise<Answer> {
    const headers: Record<string, string | null> = {
      'sec-fetch-site': 'same-origin',
      'cookie': this.cookie || null,
      'x-acting-user': this.account.id || null,
      'content-type': sent.body === undefined && sent.raw === undefined ? null : 'application/json',
      ...sent.headers,
    }
    const response = await fetch(this.origin + path, {
      method,
      redirect: 'manual',
      headers: Object.entries(headers).filter((header): header is [string, string] => header[1] !== null),
      body: sent.raw ?? (sent.body === undefined ? undefined : JSON.stringify(sent.body)),
    })
    for (const line of response.headers.getSetCookie()) this.keepCookie(line)
    const text = await response.text()
    return { status: response.status, body: text.startsWith('{') ? JSON.parse(text) : text, headers: response.headers }
  }

  get(path: string, sent?: Sent) { return this.call('GET', path, sent) }
  post(path: string, body?: unknown, sent?: Sent) { return this.call('POST', path, { body, ...sent }) }
  patch(path: string, body?: unknown, sent?: Sent) { return this.call('PATCH', path, { body, ...sent }) }
  delete(path: string, sent?: Sent) { return this.call('DELETE', path, sent) }

  async signUp(displayName: string): Promise<this> {
    const email = `${displayName.toLowerCase().replace(/\W+/g, '.')}.${randomBytes(4).toString('hex')}@example.org`
    return this.enter('/api/auth/sign-up', { email, displayName, password: PASSWORD })
  }

  async signIn(email: string): Promise<this> {
    return this.enter('/api/auth/sign-in', { email, password: PASSWORD })
  }

  private async enter(path: string, body: unknown): Promise<this> {
    const answer = await this.post(path, body, { headers: { 'x-acting-user': null } })
    if (answer.status !== 200) throw new Error(`${path} answered ${answer.status}: ${JSON.stringify(answer.body)}`)
    this.account = answer.body.account
    return this
  }

  op(kind: OpKind, entityType: RecordType, entityId: string, baseVer = 0, fields: Record<string, unknown> = {}): Op {
    this.lastSeq += 1
    return { opId: newId(), deviceId: this.deviceId, deviceSeq: this.lastSeq, schema: 1, kind, entityType, entityId, baseVer, fields }
  }

  createVessel(fields: Record<string, unknown> = {}) {
    return this.op('create', 'vessel', newId(), 0, { ...validVessel, ...fields })
  }

  createPlant(fields: Record<string, unknown> = {}) {
    return this.op('create', 'plant', newId(), 0, { ...validPlant, vesselId: null, ...fields })
  }

  createEntry(plantId: string, fields: Record<string, unknown> = {}) {
    return this.op('create', 'entry', newId(), 0, { ...validEntry, plantId, ...fields })
  }

  createComment(entry: Op, fields: Record<string, unknown> = {}) {
    return this.op('create', 'comment', newId(), 0, { ...validComment, plantId: entry.fields.plantId, entryId: entry.entityId, ...fields })
  }

  /** Sends operations; gives one result for each. */
  async push(...ops: unknown[]): Promise<OpResult[]> {
    const answer = await this.post('/api/sync/push', { ops })
    if (answer.status !== 200) throw new Error(`push answered ${answer.status}: ${JSON.stringify(answer.body)}`)
    return answer.body.results
  }

  /** Sends one operation that must take effect. */
  async done(op: Op): Promise<OpResult> {
    const [result] = await this.push(op)
    if (!result || ['rejected', 'retry'].includes(result.status)) throw new Error(`not done: ${JSON.stringify(result)}`)
    return result
  }

  async pullPage(scope: string, since = 0, limit = 500): Promise<PullResponse> {
    const answer = await this.get(`/api/sync/pull?scope=${scope}&since=${since}&limit=${limit}`)
    if (answer.status !== 200) throw new Error(`pull answered ${answer.status}: ${JSON.stringify(answer.body)}`)
    return answer.body
  }

  /** A feed as a phone holds it after reading to the end: each record once, as it is now. */
  async feed(scope = this.userFeed, limit = 500): Promise<FeedRow[]> {
    const rows = new Map<string, FeedRow>()
    for (let since = 0, more = true; more;) {
      const page = await this.pullPage(scope, since, limit)
      for (const row of page.rows) rows.set(`${row.type}/${row.id}`, row)
      since = page.next
      more = page.more
    }
    return [...rows.values()]
  }

  async row(id: string, scope = this.userFeed): Promise<FeedRow | undefined> {
    return (await this.feed(scope)).find(row => row.id === id)
  }

  /** Notices of this person, by code. */
  async notices(code: string): Promise<FeedRow[]> {
    return (await this.feed()).filter(row => row.type === 'notice' && row.data?.code === code)
  }

  /** Makes a club with this person as steward and the others as members; gives its id. */
  async club(name: string, ...members: ApiClient[]): Promise<string> {
    const made = await this.post('/api/clubs', { name })
    const id: string = made.body.club.id
    for (const member of members) await this.letIn(id, member)
    return id
  }

  async letIn(clubId: string, member: ApiClient, role = 'grower'): Promise<Answer> {
    const { body } = await this.post(`/api/clubs/${clubId}/invitations`, { role, usesLeft: 1 })
    return member.post(`/api/invitations/${body.token}/accept`)
  }

  private keepCookie(line: string): void {
    const [pair = ''] = line.split(';')
    const [name = '', value = ''] = pair.split(/=(.*)/)
    if (value) this.cookies.set(name, value)
    else this.cookies.delete(name)
  }
}

export { clubScope }
