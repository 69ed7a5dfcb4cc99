import * as z from 'zod/mini'

/** Shortest secret that seals the session cookie. */
const SESSION_PASSWORD_MIN = 32

const configurationSchema = z.object({
  databaseUrl: z.string().check(z.regex(/^(?:mariadb|mysql):\/\/\S+$/, 'NUXT_DATABASE_URL must be a mariadb:// address')),
  uploadsDir: z.string().check(z.regex(/^\//, 'NUXT_UPLOADS_DIR must be an absolute folder')),
  smtpUrl: z.string(),
  demo: z.boolean(),
  sessionPassword: z.string().check(z.minLength(SESSION_PASSWORD_MIN, `NUXT_SESSION_PASSWORD must have ${SESSION_PASSWORD_MIN} characters or more`)),
})
export type Configuration = z.infer<typeof configurationSchema>

/** @throws Error that names every setting that is missing or wrong */
export function readConfiguration(raw: Record<string, unknown>): Configuration {
  const parsed = configurationSchema.safeParse(raw)
  if (parsed.success) return parsed.data
  throw new Error(`Stillroot cannot start: ${parsed.error.issues.map(issue => issue.message).join('; ')}`)
}
