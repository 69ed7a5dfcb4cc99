import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { database } from '#server/database/connection'
import { migrator } from '#server/database/migrate'
import { migrations } from '#server/database/migrations/index'
import { openTestDatabase } from '../support/opened-database'
import type { OpenedDatabase } from '../support/opened-database'

let opened: OpenedDatabase
beforeAll(async () => {
  opened = await openTestDatabase({ schema: false })
})
afterAll(() => opened.close())

type Column = { table: string, column: string, type: string, nullable: string, key: string }

async function columns(): Promise<Column[]> {
  return await opened.query(
    `SELECT table_name AS 'table', column_name AS 'column', column_type AS type, is_nullable AS nullable, column_key AS 'key'
     FROM information_schema.columns WHERE table_schema = ? AND table_name <> 'applied_migration'
     ORDER BY table_name, ordinal_position`, [opened.name],
  ) as Column[]
}

describe('the steps of the schema', () => {
  it('go up, down and up again to the same tables', async () => {
    const applied = await migrator().up()
    expect(applied.map(({ name }) => name)).toEqual(migrations.map(({ name }) => name))
    const first = await columns()
    expect(new Set(first.map(({ table }) => table)).size).toBeGreaterThan(10)

    await migrator().down({ to: 0 })
    expect(await columns()).toEqual([])

    await migrator().up()
    expect(await columns()).toEqual(first)
  })

  it('have nothing left to do afterwards', async () => {
    expect(await migrator().pending()).toEqual([])
    expect(await migrator().up()).toEqual([])
  })

  it('leave no table without transactions, and none that would bend text', async () => {
    const tables = await opened.query(
      'SELECT engine, table_collation AS collation FROM information_schema.tables WHERE table_schema = ? AND table_name <> \'applied_migration\'',
      [opened.name],
    ) as { engine: string, collation: string }[]
    expect(new Set(tables.map(({ engine }) => engine))).toEqual(new Set(['InnoDB']))
    expect(new Set(tables.map(({ collation }) => collation))).toEqual(new Set(['utf8mb4_bin']))
  })
})

describe('the models', () => {
  it('name the columns that the tables have', async () => {
    const known = new Map<string, string[]>()
    for (const { table, column } of await columns()) known.set(table, [...known.get(table) ?? [], column])
    const models = Object.values(database().models).filter(model => model.getTableName() !== 'applied_migration')
    expect(models.length).toBeGreaterThan(10)
    for (const model of models) {
      const named = Object.values(model.getAttributes()).map(attribute => attribute.field)
      expect({ table: model.getTableName(), columns: named.toSorted() })
        .toEqual({ table: model.getTableName(), columns: known.get(String(model.getTableName()))?.toSorted() })
    }
  })
})
