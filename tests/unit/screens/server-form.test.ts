import { describe, expect, it } from 'vitest'
import * as z from 'zod/mini'
import { useServerForm } from '~/composables/useServerForm'

const schema = z.strictObject({ name: z.string().check(z.minLength(1, 'is empty')) })

describe('a form that needs the server', () => {
  it('asks nobody while a field is wrong', async () => {
    const form = useServerForm({ name: 'Name' })
    let asked = 0
    expect(await form.submit(schema, { name: '' }, async () => ({ ok: true, body: asked++ }))).toBeNull()
    expect({ asked, errors: form.errors.value }).toEqual({ asked: 0, errors: { name: 'Name is empty.' } })
  })

  it('shows the server’s issues at their fields, and clears them at the next try', async () => {
    const form = useServerForm({ name: 'Name' })
    await form.submit(schema, { name: 'x' }, async () => ({
      ok: false, status: 409, code: 'taken', message: 'Taken.', issues: [{ path: 'name', message: 'is in use' }],
    }))
    expect([form.errors.value.name, form.message.value, form.code.value]).toEqual(['Name is in use.', 'Taken.', 'taken'])
    expect(await form.submit(schema, { name: 'y' }, async () => ({ ok: true, body: 'done' }))).toBe('done')
    expect([form.errors.value, form.message.value, form.code.value]).toEqual([{}, null, null])
  })

  it('sends once, however often the button is pressed', async () => {
    const form = useServerForm({})
    let asked = 0
    let answer: (value: { ok: true, body: number }) => void = () => {}
    const first = form.submit(schema, { name: 'x' }, () => new Promise<{ ok: true, body: number }>((resolve) => {
      asked += 1
      answer = resolve
    }))
    expect(await form.submit(schema, { name: 'x' }, async () => ({ ok: true, body: asked++ }))).toBeNull()
    answer({ ok: true, body: 7 })
    expect(await first).toBe(7)
    expect([asked, form.busy.value]).toEqual([1, false])
  })
})
