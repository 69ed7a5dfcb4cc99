import { once } from 'node:events'
import { mkdtemp, rm, stat, writeFile } from 'node:fs/promises'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createTransport } from 'nodemailer'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { adminAccountStatements, appAccountStatements } from '~/scripts/lib/database-accounts.mjs'
import { serverArguments } from '~/scripts/lib/mariadb.mjs'
import { demoFor } from '~/scripts/lib/options.mjs'
import { firstFreePort, freePort, tryPort } from '~/scripts/lib/ports.mjs'
import { keptSecret } from '~/scripts/lib/secrets.mjs'
import { startTestMail } from '~/tests/support/mail'

let folder = ''
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'stillroot-unit-'))
})
afterEach(() => rm(folder, { recursive: true, force: true }))

describe('a port', () => {
  it('that somebody else listens on is passed over', async () => {
    const taken = await freePort()
    const other = createServer().listen(taken, '127.0.0.1')
    await once(other, 'listening')
    expect(await tryPort(taken, '127.0.0.1')).toBeUndefined()
    expect(await firstFreePort(taken, '127.0.0.1')).toBeGreaterThan(taken)
    other.close()
  })
})

describe('a kept secret', () => {
  it('is long, stays the same and is closed to others', async () => {
    const file = join(folder, 'deep/secret')
    const secret = keptSecret(file)
    expect(secret.length).toBeGreaterThanOrEqual(48)
    expect(keptSecret(file)).toBe(secret)
    expect((await stat(file)).mode & 0o777).toBe(0o600)
  })

  it('is made anew when its file is empty', async () => {
    const file = join(folder, 'secret')
    await writeFile(file, '\n')
    expect(keptSecret(file)).not.toBe('')
  })
})

describe('the private database', () => {
  it('keeps every commit through a power cut and listens on loopback only', () => {
    const words = serverArguments('/somewhere')
    expect(words).toContain('--innodb-flush-log-at-trx-commit=1')
    expect(words).toContain('--bind-address=127.0.0.1')
  })

  it('closes the accounts that come without a password before it opens another', () => {
    for (const statements of [appAccountStatements({ database: 'garden', user: 'gardener', password: 'abc' }), adminAccountStatements('abc')]) {
      const [first] = statements
      expect(first).toContain('DELETE FROM mysql.global_priv')
    }
  })

  it('gives the app its own database and no other', () => {
    const grants = appAccountStatements({ database: 'garden', user: 'gardener', password: 'abc' }).filter(text => text.startsWith('GRANT'))
    expect(grants).toEqual(['GRANT ALL ON garden.* TO \'gardener\'@\'127.0.0.1\''])
  })

  it('refuses a password that would end its quotes', () => {
    expect(() => adminAccountStatements('a\'; DROP DATABASE garden')).toThrow('Unexpected character')
  })
})

describe('the demo club', () => {
  it('grows by itself only in a private database', () => {
    expect(demoFor(undefined, true)).toBe(true)
    expect(demoFor(undefined, false)).toBe(false)
  })

  it('follows what was asked for', () => {
    expect(demoFor(true, false)).toBe(true)
    expect(demoFor(false, true)).toBe(false)
  })
})

describe('the mail catcher', () => {
  it('keeps messages whole and in order', async () => {
    const mail = await startTestMail()
    const transport = createTransport(mail.env.NUXT_SMTP_URL)
    for (const subject of ['First', 'Second']) {
      await transport.sendMail({ from: 'club@example.org', to: 'grower@example.org', subject, text: 'A link' })
    }
    const subjects = (await mail.messages()).map(message => /^Subject: (.*)\r$/m.exec(message)?.[1])
    expect(subjects).toEqual(['First', 'Second'])
    await mail.stop()
  })
})
