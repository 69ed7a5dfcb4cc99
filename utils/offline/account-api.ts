import * as z from 'zod/mini'
import type { FieldIssue } from '#shared/sync/protocol'

const issuesSchema = z.array(z.object({ path: z.string(), message: z.string() }))
const refusalSchema = z.object({ code: z.string(), message: z.string(), issues: z.optional(issuesSchema) })

/** What a form gets back from the server. */
export type FormAnswer<T> =
  | { ok: true, body: T }
  | { ok: false, status: number | null, code: string, message: string, issues: FieldIssue[] }

const NO_SIGNAL = 'There is no answer from the server. Nothing was lost; try again when there is signal.'

/** One request of a form that needs the server. Never throws. */
export async function request<T>(
  method: 'GET' | 'POST' | 'PATCH' | 'DELETE', url: string, schema: z.ZodMiniType<T>, body?: unknown, timeoutMilliseconds = 20_000,
): Promise<FormAnswer<T>> {
  try {
    const response = await fetch(url, {
      method,
      headers: body === undefined ? {} : { 'Content-Type': 'application/json' },
      body: body === undefined ? undefined : JSON.stringify(body),
      signal: AbortSignal.timeout(timeoutMilliseconds),
    })
    const text: unknown = await response.json()
    if (response.ok) return { ok: true, body: schema.parse(text) }
    const refusal = refusalSchema.parse(text)
    return { ok: false, status: response.status, code: refusal.code, message: refusal.message, issues: refusal.issues ?? [] }
  } catch {
    return { ok: false, status: null, code: 'unreachable', message: NO_SIGNAL, issues: [] }
  }
}
