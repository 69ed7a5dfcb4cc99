import * as z from 'zod/mini'
import { opSchema, RECORD_TYPES } from '#shared/sync/protocol'
import type { PullResponse, PushResponse } from '#shared/sync/protocol'
import type { Answer, SyncTransport } from './ports'

/** How long an answer may take. */
const TIMEOUT_MILLISECONDS = 30_000

const recordState = {
  type: z.enum(RECORD_TYPES),
  id: z.string(),
  ver: z.int(),
  state: z.enum(['live', 'deleted', 'revoked']),
  data: z.nullable(z.record(z.string(), z.unknown())),
}
const issues = z.array(z.object({ path: z.string(), message: z.string() }))

const pushResponseSchema: z.ZodMiniType<PushResponse> = z.object({
  serverTime: z.string(),
  epoch: z.string(),
  minSchema: z.int(),
  results: z.array(z.object({
    opId: z.string(),
    status: z.enum(['applied', 'merged', 'kept_both', 'duplicate', 'rejected', 'retry']),
    record: z.nullable(z.object(recordState)),
    code: z.optional(z.string()),
    message: z.optional(z.string()),
    issues: z.optional(issues),
  })),
})

const pullResponseSchema: z.ZodMiniType<PullResponse> = z.object({
  serverTime: z.string(),
  epoch: z.string(),
  minSchema: z.int(),
  rows: z.array(z.object({ seq: z.int(), seen: z.int(), ...recordState })),
  next: z.int(),
  more: z.boolean(),
})

const refusalSchema = z.object({ code: z.string(), message: z.string() })

/**
 * The way to the server over HTTP. Anything that does not look like our
 * server's answer, such as the sign-in page of a public network, counts as no
 * answer at all.
 */
export const httpTransport: SyncTransport = {
  push: (accountId, ops) => ask('/api/sync/push', accountId, pushResponseSchema, {
    method: 'POST',
    body: JSON.stringify({ ops: ops.map(op => opSchema.parse(op)) }),
    headers: { 'Content-Type': 'application/json' },
  }),
  pull: (accountId, scope, since, limit) => ask(
    `/api/sync/pull?${new URLSearchParams({ scope, since: String(since), limit: String(limit) })}`, accountId, pullResponseSchema, {},
  ),
}

/** One request as `accountId`; the server refuses it when somebody else is signed in. */
export async function ask<T>(url: string, accountId: string, schema: z.ZodMiniType<T>, init: RequestInit): Promise<Answer<T>> {
  try {
    const response = await fetch(url, {
      ...init,
      headers: { ...init.headers, 'X-Acting-User': accountId },
      signal: AbortSignal.timeout(TIMEOUT_MILLISECONDS),
    })
    const body: unknown = await response.json()
    if (!response.ok) return refusal(response, body)
    const parsed = schema.safeParse(body)
    return parsed.success ? { kind: 'answered', body: parsed.data } : { kind: 'unreachable' }
  } catch {
    return { kind: 'unreachable' }
  }
}

function refusal(response: Response, body: unknown): Answer<never> {
  const parsed = refusalSchema.safeParse(body)
  if (!parsed.success && response.status < 500) return { kind: 'unreachable' }
  const retryAfter = Number(response.headers.get('Retry-After') ?? Number.NaN)
  return {
    kind: 'refused',
    status: response.status,
    code: parsed.data?.code ?? null,
    message: parsed.data?.message ?? null,
    retryAfterSeconds: Number.isFinite(retryAfter) ? retryAfter : null,
  }
}
