import { createError, defineEventHandler, getHeader, getQuery, getRouterParams, readBody, setResponseHeader, setResponseStatus } from 'h3'
import type { H3Event } from 'h3'
import type * as z from 'zod/mini'
import type { Account } from '#shared/domain/account.schema'
import { checkWith } from '#shared/sync/record-schemas'
import { isDatabaseAway } from '../database/failures'
import { whenReady } from '../services/readiness'
import { accountOfRequest } from '../services/sessions'
import { TemporaryFailure } from '../services/sync/ports'
import { accountMismatch, ApiError, crossSiteRequest, invalid, notFound, notSignedIn, tooLarge, unavailable, unreadableRequest } from './errors'
import { reportFault } from './report-fault'

type Schema = z.ZodMiniType
type Output<S> = S extends Schema ? z.output<S> : undefined

/** What a route promises, as data: who may call it and what it takes. */
export type RouteSpec<
  A extends 'account' | 'public',
  P extends Schema | undefined,
  Q extends Schema | undefined,
  B extends Schema | undefined,
> = {
  /** `public` is said aloud where no session is needed. */
  auth: A
  params?: P
  query?: Q
  body?: B
  /** Most bytes of a JSON body; 64 KiB unless told. */
  bodyBytesMax?: number
  /** True where the sender must name the account that the work belongs to. */
  actingAccount?: boolean
}

export type RouteInput<A, P, Q, B> = {
  event: H3Event
  account: A extends 'account' ? Account : Account | null
  params: Output<P>
  query: Output<Q>
  body: Output<B>
}

const SAFE_METHODS = ['GET', 'HEAD', 'OPTIONS']

/**
 * The one way to make a route. Checks origin, session, acting account, params,
 * query and body, in that order, before the handler runs; turns every failure
 * into `{ code, message, issues? }`.
 */
export function defineRoute<
  A extends 'account' | 'public',
  P extends Schema | undefined = undefined,
  Q extends Schema | undefined = undefined,
  B extends Schema | undefined = undefined,
>(spec: RouteSpec<A, P, Q, B>, handler: (input: RouteInput<A, P, Q, B>) => unknown) {
  return defineEventHandler(async (event) => {
    try {
      await untilReady()
      refuseCrossSite(event)
      const account = await accountOfRequest(event)
      if (spec.auth === 'account' && !account) throw notSignedIn()
      if (spec.auth === 'account') refuseOtherAccount(event, account, spec.actingAccount ?? false)
      const input = {
        event,
        account,
        params: check(spec.params, getRouterParams(event), notFound),
        query: check(spec.query, numbersInQuery(getQuery(event))),
        body: spec.body ? check(spec.body, await readJson(event, spec.bodyBytesMax ?? 65_536)) : undefined,
      }
      setResponseHeader(event, 'Cache-Control', 'no-store')
      // Each part was checked with its schema just above; the compiler cannot follow that through four type parameters.
      // eslint-disable-next-line @typescript-eslint/consistent-type-assertions
      return await handler(input as RouteInput<A, P, Q, B>)
    } catch (error) {
      return answerFailure(event, error)
    }
  })
}

/** A request that comes while the server still starts waits for it. */
async function untilReady(): Promise<void> {
  try {
    await whenReady()
  } catch {
    throw unavailable()
  }
}

/** Fetch metadata first; the exact origin where a browser does not send it. */
function refuseCrossSite(event: H3Event): void {
  if (SAFE_METHODS.includes(event.method)) return
  const site = getHeader(event, 'sec-fetch-site')
  if (site === 'same-origin') return
  const origin = getHeader(event, 'origin')
  if (!site && origin && URL.canParse(origin) && new URL(origin).host === getHeader(event, 'host')) return
  throw crossSiteRequest()
}

/** Whoever names the account that the work belongs to must be signed in as it, asked for or not. */
function refuseOtherAccount(event: H3Event, account: Account | null, mustBeNamed: boolean): void {
  const named = getHeader(event, 'x-acting-user')
  if (named === undefined ? mustBeNamed : named !== account?.id) throw accountMismatch()
}

function check(schema: Schema | undefined, value: unknown, onFailure?: () => ApiError): unknown {
  if (!schema) return undefined
  const checked = checkWith(schema, value)
  if (checked.ok) return checked.fields
  throw onFailure ? onFailure() : invalid(checked.issues)
}

/** Query values arrive as text; a value that is a plain whole number is read as one. */
function numbersInQuery(query: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(query).map(([key, value]) => (
    [key, typeof value === 'string' && /^\d{1,15}$/.test(value) ? Number(value) : value]
  )))
}

async function readJson(event: H3Event, bytesMax: number): Promise<unknown> {
  if (!getHeader(event, 'content-type')?.startsWith('application/json')) throw unreadableRequest()
  // A body without a length could grow for ever; every browser gives one.
  const length = Number(getHeader(event, 'content-length') ?? Number.NaN)
  if (Number.isNaN(length)) throw unreadableRequest()
  if (length > bytesMax) throw tooLarge()
  try {
    return await readBody(event, { strict: true })
  } catch {
    throw unreadableRequest()
  }
}

function answerFailure(event: H3Event, error: unknown) {
  const failure = toApiError(error)
  if (!failure) {
    reportFault(`unexpected failure in ${event.method} ${event.path.split('?')[0]}`, error)
    throw createError({ statusCode: 500, statusMessage: 'Unexpected failure' })
  }
  setResponseStatus(event, failure.status)
  setResponseHeader(event, 'Cache-Control', 'no-store')
  if (failure.retryAfterSeconds) setResponseHeader(event, 'Retry-After', failure.retryAfterSeconds)
  return { code: failure.code, message: failure.message, ...(failure.issues ? { issues: failure.issues } : {}) }
}

function toApiError(error: unknown): ApiError | null {
  if (error instanceof ApiError) return error
  return error instanceof TemporaryFailure || isDatabaseAway(error) ? unavailable() : null
}
