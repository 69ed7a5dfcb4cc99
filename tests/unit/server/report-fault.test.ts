import { DatabaseError } from 'sequelize'
import { describe, expect, it } from 'vitest'
import { describeFault } from '#server/utils/report-fault'

describe('what the log says of a fault', () => {
  it('leaves out what a person wrote', () => {
    const original = Object.assign(new Error('Data too long: INSERT INTO entry VALUES (\'my secret note\')'), {
      sql: 'INSERT INTO entry VALUES (\'my secret note\')', errno: 1406, code: 'ER_DATA_TOO_LONG',
    })
    const said = describeFault(new DatabaseError(original))
    expect(said).toContain('SequelizeDatabaseError ER_DATA_TOO_LONG (1406)')
    expect(said).not.toContain('secret')
    expect(describeFault(original)).not.toContain('secret')
  })

  it('says where a fault of ours is', () => {
    const said = describeFault(new TypeError('x is not a function'))
    expect(said).toContain('TypeError: x is not a function')
    expect(said).toContain('report-fault.test')
  })

  it('does not print what was thrown when it is no error', () => {
    expect(describeFault('my secret note')).toBe('string')
  })
})
