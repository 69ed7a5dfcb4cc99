import { describe, expect, it } from 'vitest'
import { keys } from '~/utils/offline/keys'
import { forgetKeptPictures } from '~/utils/offline/pictures'
import { createMemoryStorage } from '../../support/memory-storage'

describe('a full phone', () => {
  it('lets go of the copies it keeps, and of nothing else', async () => {
    const storage = createMemoryStorage()
    const bytes = new ArrayBuffer(3)
    await storage.transact({}, () => ({
      result: null,
      put: [
        [keys.picture('a'), bytes], [keys.picture('b'), bytes], [keys.keptPictures, ['a', 'b']], [keys.bytes('taken here'), bytes], [keys.draft('plant'), 'half a note'],
      ],
    }))
    expect(await forgetKeptPictures({ storage })).toBe(true)
    expect([...storage.contents().keys()].sort()).toEqual([keys.bytes('taken here'), keys.draft('plant')])
    expect(await forgetKeptPictures({ storage })).toBe(false)
  })
})
