import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ApiClient, PASSWORD } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'

let app: RunningApp
let ada: ApiClient
let ben: ApiClient

beforeAll(async () => {
  app = await startApp()
  ada = await new ApiClient(app.origin).signUp('Ada')
  ben = await new ApiClient(app.origin).signUp('Ben')
})
afterAll(() => app.dispose())

describe('health', () => {
  it('answers that the server is there, and sets no cookie', async () => {
    const { status, body, headers } = await new ApiClient(app.origin).get('/api/health')
    expect({ status, body }).toEqual({ status: 200, body: { ok: true } })
    expect(headers.getSetCookie()).toEqual([])
  })
})

describe('sign-up', () => {
  it('makes an account and signs in with it', async () => {
    expect((await ada.get('/api/auth/me')).body.account).toEqual(ada.account)
  })

  it('takes an address once, however it is written', async () => {
    const { status, body } = await new ApiClient(app.origin).post('/api/auth/sign-up', {
      email: ` ${ada.account.email.toUpperCase()}`.trim(), displayName: 'Another Ada', password: PASSWORD,
    })
    expect({ status, code: body.code, paths: body.issues.map((issue: { path: string }) => issue.path) })
      .toEqual({ status: 409, code: 'email_taken', paths: ['email'] })
  })

  it('says every field that is wrong', async () => {
    const { status, body } = await new ApiClient(app.origin).post('/api/auth/sign-up', {
      email: 'no address', displayName: '   ', password: 'short', admin: true,
    })
    expect({ status, code: body.code }).toEqual({ status: 422, code: 'invalid' })
    expect(body.issues.map((issue: { path: string }) => issue.path).toSorted()).toEqual(['', 'displayName', 'email', 'password'])
  })

  it('hands out a cookie that scripts cannot read and other sites do not send', async () => {
    const { headers } = await new ApiClient(app.origin).post('/api/auth/sign-in', { email: ada.account.email, password: PASSWORD })
    const [cookie = ''] = headers.getSetCookie()
    expect(cookie).toMatch(/; HttpOnly/)
    expect(cookie).toMatch(/; SameSite=Lax/)
    expect(cookie).toMatch(/; Secure/)
    expect(cookie).not.toContain(ada.account.id)
  })
})

describe('sign-in', () => {
  it('answers a wrong password and an unknown address alike', async () => {
    const stranger = new ApiClient(app.origin)
    const wrong = await stranger.post('/api/auth/sign-in', { email: ada.account.email, password: 'not the password' })
    const unknown = await stranger.post('/api/auth/sign-in', { email: 'nobody@example.org', password: 'not the password' })
    expect(wrong.status).toBe(401)
    expect(wrong.body.code).toBe('wrong_credentials')
    expect(unknown).toMatchObject({ status: 401, body: wrong.body })
    expect(stranger.cookie).toBe('')
  })

  it('takes the address in any case', async () => {
    const phone = await new ApiClient(app.origin).signIn(ada.account.email.toUpperCase())
    expect(phone.account).toEqual(ada.account)
  })

  it('leaves nothing of the person before in the same browser', async () => {
    const shared = await new ApiClient(app.origin).signIn(ada.account.email)
    const cookieOfAda = shared.cookie
    await shared.signIn(ben.account.email)
    expect((await shared.get('/api/auth/me')).body.account).toEqual(ben.account)
    expect((await shared.get(`/api/sync/pull?scope=user:${ada.account.id}&since=0&limit=10`)).status).toBe(404)
    const old = await new ApiClient(app.origin).get('/api/auth/me', { headers: { cookie: cookieOfAda } })
    expect(old.body).toEqual({ account: null })
  })

  it('says who is wrong with a body that is no sign-in', async () => {
    const { status, body } = await new ApiClient(app.origin).post('/api/auth/sign-in', { email: 7 })
    expect(status).toBe(422)
    expect(body.issues.map((issue: { path: string }) => issue.path).toSorted()).toEqual(['email', 'password'])
  })
})

describe('sign-out', () => {
  it('ends the session on the server, so that a copied cookie is worth nothing', async () => {
    const phone = await new ApiClient(app.origin).signIn(ben.account.email)
    const copied = phone.cookie
    expect((await phone.post('/api/auth/sign-out')).body).toEqual({ signedOut: true })
    expect((await phone.get('/api/auth/me')).body).toEqual({ account: null })
    const thief = await new ApiClient(app.origin).get(`/api/sync/pull?scope=${ben.userFeed}&since=0&limit=10`, {
      headers: { 'cookie': copied, 'x-acting-user': ben.account.id },
    })
    expect({ status: thief.status, code: thief.body.code }).toEqual({ status: 401, code: 'not_signed_in' })
  })

  it('leaves the person’s other phones signed in', async () => {
    expect((await ben.get('/api/auth/me')).body.account).toEqual(ben.account)
  })

  it('is fine twice, and for somebody who was not signed in', async () => {
    const stranger = new ApiClient(app.origin)
    for (let time = 0; time < 2; time += 1) {
      expect((await stranger.post('/api/auth/sign-out')).body).toEqual({ signedOut: true })
    }
  })
})

describe('a session', () => {
  it('outlives a restart of the server', async () => {
    await app.restart()
    expect((await ada.get('/api/auth/me')).body.account).toEqual(ada.account)
  })

  it('is not taken from a header', async () => {
    const value = ada.cookie.split('=').slice(1).join('=')
    const { body } = await new ApiClient(app.origin).get('/api/auth/me', { headers: { 'x-stillroot-session-session': value } })
    expect(body).toEqual({ account: null })
  })
})
