import type * as z from 'zod/mini'

/** Whether the schema takes the value. */
export function accepts(schema: z.ZodMiniType, value: unknown): boolean {
  return schema.safeParse(value).success
}

/** Paths of what the schema finds wrong, each once, for example `actions.0`; empty when it takes the value. */
export function wrongPaths(schema: z.ZodMiniType, value: unknown): string[] {
  const parsed = schema.safeParse(value)
  return parsed.success ? [] : [...new Set(parsed.error.issues.map(issue => issue.path.join('.')))]
}
