import { existsSync } from 'node:fs'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ApiClient, newId } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'
import { projectFiles, projectRoot, readProjectFile } from '../support/project-files'
import { methodOf, routes } from './routes'

const API = 'server/api/'
const changing = routes.filter(route => methodOf(route) !== 'GET')
const forAccounts = routes.filter(route => route.auth === 'account')

describe('the list of routes', () => {
  const files = projectFiles('.ts').filter(path => path.startsWith(API)).map(path => path.slice(API.length))

  it('names every route there is, and no other', () => {
    expect(files.length).toBeGreaterThan(10)
    expect(routes.map(route => route.file).toSorted()).toEqual(files.toSorted())
  })

  it.each(routes)('says of $file what the route says of itself', ({ file, auth }) => {
    expect(readProjectFile(API + file)).toContain(`auth: '${auth}'`)
  })

  it.each(routes)('names tests of $file that call it', (route) => {
    const { file, tests } = route
    const source = `tests/integration/${tests}`
    expect(existsSync(projectRoot + source), `${source} is missing`).toBe(true)
    const lastWord = file.replace(/(?:\/index)?\.\w+\.ts$/, '').split('/').filter(part => !part.startsWith('[')).at(-1)
    expect(readProjectFile(source)).toContain(String(lastWord))
    const method = methodOf(route)
    if (method !== 'GET') expect(readProjectFile(source)).toMatch(new RegExp(`${method.toLowerCase()}\\(|'${method}'`))
  })
})

describe('every route', () => {
  let app: RunningApp
  let signedIn: ApiClient

  beforeAll(async () => {
    app = await startApp()
    signedIn = await new ApiClient(app.origin).signUp('Ida')
  })
  afterAll(() => app.dispose())

  it.each(forAccounts)('$file answers 401 without a session', async (route) => {
    const { status, body, headers } = await new ApiClient(app.origin).call(methodOf(route), route.path, { body: route.body })
    expect({ status, code: body.code }).toEqual({ status: 401, code: 'not_signed_in' })
    expect(headers.get('cache-control')).toBe('no-store')
    expect(headers.getSetCookie()).toEqual([])
  })

  it.each(forAccounts)('$file answers 401 to a forged session', async (route) => {
    const forged = { cookie: `stillroot-session=Fe26.2**${'0'.repeat(64)}*x*x*x*x*x` }
    const { status } = await new ApiClient(app.origin).call(methodOf(route), route.path, { body: route.body, headers: forged })
    expect(status).toBe(401)
  })

  it.each(forAccounts)('$file answers 409 when the sender means another account', async (route) => {
    const headers = { 'x-acting-user': newId() }
    const { status, body } = await signedIn.call(methodOf(route), route.path, { body: route.body, headers })
    expect({ status, code: body.code }).toEqual({ status: 409, code: 'account_mismatch' })
  })

  it.each(changing)('$file answers 403 to another site', async (route) => {
    const foreign: Record<string, string | null>[] = [
      { 'sec-fetch-site': 'cross-site' },
      { 'sec-fetch-site': 'same-site' },
      { 'sec-fetch-site': 'none' },
      { 'sec-fetch-site': null, 'origin': 'https://elsewhere.example' },
      { 'sec-fetch-site': null, 'origin': 'null' },
      { 'sec-fetch-site': null },
    ]
    for (const headers of foreign) {
      const { status, body } = await signedIn.call(methodOf(route), route.path, { body: route.body, headers })
      expect({ headers, status, code: body.code }).toEqual({ headers, status: 403, code: 'cross_site' })
    }
  })

  it('takes the exact origin where a browser sends no fetch metadata', async () => {
    const { status } = await signedIn.post('/api/clubs', { name: 'From an older browser' }, {
      headers: { 'sec-fetch-site': null, 'origin': app.origin },
    })
    expect(status).toBe(200)
  })

  it.each(changing.filter(route => route.body !== undefined))('$file answers 400 to a body it cannot read', async (route) => {
    for (const sent of [
      { raw: '{"ops":' },
      { raw: '{"ops":', headers: { 'content-type': 'application/json; charset=utf-8' } },
      { raw: JSON.stringify(route.body), headers: { 'content-type': 'text/plain' } },
      { raw: JSON.stringify(route.body), headers: { 'content-type': null } },
    ]) {
      const { status, body } = await signedIn.call(methodOf(route), route.path, sent)
      expect({ sent, status, code: body.code }).toEqual({ sent, status: 400, code: 'unreadable' })
    }
  })

  it.each(changing.filter(route => route.body !== undefined))('$file answers 413 to a body that is too long', async (route) => {
    const { status, body } = await signedIn.call(methodOf(route), route.path, { raw: JSON.stringify({ ops: 'x'.repeat(300_000) }) })
    expect({ status, code: body.code }).toEqual({ status: 413, code: 'too_large' })
  })

  it('still answers after all that', async () => {
    expect((await signedIn.get('/api/health')).body).toEqual({ ok: true })
    expect(app.logs()).not.toContain('unexpected failure')
  })
})
