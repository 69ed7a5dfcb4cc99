import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { settingProblems } from '#server/database/required-settings'
import { startApp } from '../support/app-server'
import { createTestDatabase } from '../support/database'
import type { TestDatabase } from '../support/database'

const safe = {
  innodb_flush_log_at_trx_commit: '1',
  sql_mode: 'STRICT_ALL_TABLES,NO_ZERO_DATE',
  character_set_database: 'utf8mb4',
  default_storage_engine: 'InnoDB',
}

describe('the settings a database must have', () => {
  it('are fine when all are as they must be', () => {
    expect(settingProblems(safe)).toEqual([])
    expect(settingProblems({ ...safe, sql_mode: 'STRICT_TRANS_TABLES' })).toEqual([])
  })

  it.each([
    ['innodb_flush_log_at_trx_commit', '2', /innodb_flush_log_at_trx_commit/],
    ['innodb_flush_log_at_trx_commit', '0', /innodb_flush_log_at_trx_commit/],
    ['sql_mode', 'NO_ZERO_DATE', /sql_mode/],
    ['character_set_database', 'latin1', /utf8mb4/],
    ['character_set_database', 'utf8mb3', /utf8mb4/],
    ['default_storage_engine', 'MyISAM', /InnoDB/],
  ])('with %s = %s are refused by name', (name, value, words) => {
    expect(settingProblems({ ...safe, [name]: value })).toEqual([expect.stringMatching(words)])
  })

  it('are refused when the database does not tell', () => {
    expect(settingProblems({})).toHaveLength(4)
  })
})

describe('the server', () => {
  let latin: TestDatabase
  beforeAll(async () => {
    latin = await createTestDatabase()
    await latin.query(`ALTER DATABASE ${latin.name} CHARACTER SET latin1`)
  })
  afterAll(() => latin.drop())

  it('does not start on a database that would lose characters, says why, and makes no table', async () => {
    await expect(startApp({ databaseUrl: latin.url })).rejects.toThrow(/the character set must be utf8mb4/)
    expect(await latin.query('SHOW TABLES')).toHaveLength(0)
  })

  it.each([
    ['NUXT_SESSION_PASSWORD', 'too short'],
    ['NUXT_SESSION_PASSWORD', ''],
    ['NUXT_DATABASE_URL', 'postgres://somewhere/else'],
    ['NUXT_UPLOADS_DIR', 'relative/folder'],
  ])('does not start with %s = "%s", and names it', async (name, value) => {
    await expect(startApp({ databaseUrl: latin.url, env: { [name]: value } })).rejects.toThrow(name)
  })
})
