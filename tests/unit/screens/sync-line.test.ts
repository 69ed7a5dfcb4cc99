import { describe, expect, it } from 'vitest'
import { syncLine, waitingWords } from '~/utils/words/sync-line'
import type { SyncSituation } from '~/utils/words/sync-line'

const quiet: SyncSituation = { reason: 'sent', changes: 0, photos: 0, attention: 0, oldTab: false }
const line = (situation: Partial<SyncSituation>) => syncLine({ ...quiet, ...situation }, 'en')

describe('the sync line', () => {
  it.each<[Partial<SyncSituation>, string]>([
    [{}, 'Everything is sent'],
    [{ reason: 'no-signal' }, 'No signal. Everything is sent.'],
    [{ reason: 'no-signal', changes: 2, photos: 1 }, '2 changes and 1 photo wait for signal'],
    [{ reason: 'no-signal', changes: 1 }, '1 change waits for signal'],
    [{ reason: 'no-signal', photos: 1 }, '1 photo waits for signal'],
    [{ reason: 'server', changes: 3 }, '3 changes wait for the server'],
    [{ reason: 'sending', changes: 1, photos: 2 }, 'Sending 1 change and 2 photos'],
    [{ reason: 'signed-out', changes: 2, photos: 1 }, 'Sign in to send 3 items'],
    [{ reason: 'signed-out', changes: 1 }, 'Sign in to send 1 item'],
    [{ reason: 'update-needed', changes: 2 }, 'Reload to get the new version, then 2 changes can go'],
    [{ attention: 1 }, '1 needs attention'],
    [{ attention: 2, changes: 1, reason: 'no-signal' }, '2 need attention, 1 change not sent'],
  ])('says of %j: %s', (situation, text) => {
    expect(line(situation).text).toBe(text)
  })

  it('never calls it sent while something waits', () => {
    for (const reason of ['no-signal', 'server', 'sending', 'signed-out', 'other-account', 'update-needed'] as const) {
      for (const [changes, photos] of [[1, 0], [0, 1], [4, 4]] as const) {
        const words = line({ reason, changes, photos })
        expect(words.text).not.toMatch(/everything is sent/i)
        expect(words.tone).not.toBe('leaf')
      }
    }
  })

  it('leads to what can be done', () => {
    expect(line({ attention: 1 }).act).toBe('attention')
    expect(line({ reason: 'signed-out' }).act).toBe('sign-in')
    expect(line({ reason: 'other-account', changes: 1 }).act).toBe('sign-in')
    expect(line({ reason: 'store' }).act).toBe('reload')
    expect(line({ reason: 'no-signal', changes: 1 }).act).toBeNull()
  })

  it('tells of an older tab before anything else', () => {
    expect(line({ oldTab: true, attention: 3 }).text).toMatch(/^An older tab/)
  })

  it('has nothing to say when nothing waits', () => {
    expect(waitingWords(0, 0)).toBeNull()
  })
})
