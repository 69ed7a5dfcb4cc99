import { mkdtemp, readdir, readFile, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { startMailCatcher } from '~/scripts/lib/mail-catcher.mjs'

export interface TestMail {
  /** For the app's environment, so that its mail ends here. */
  env: Record<string, string>
  /** The raw messages so far, oldest first. */
  messages: () => Promise<string[]>
  stop: () => Promise<void>
}

export async function startTestMail(): Promise<TestMail> {
  const folder = await mkdtemp(join(tmpdir(), 'stillroot-mail-'))
  const catcher = await startMailCatcher(folder)
  return {
    env: { NUXT_SMTP_URL: `smtp://127.0.0.1:${catcher.port}`, NUXT_MAIL_DIR: folder },
    messages: async () => {
      const names = (await readdir(folder)).filter(name => name.endsWith('.eml')).sort()
      return Promise.all(names.map(name => readFile(join(folder, name), 'utf8')))
    },
    stop: async () => {
      await catcher.stop()
      await rm(folder, { recursive: true, force: true })
    },
  }
}
