/** The server's own way to its records, opened inside the test: no server, no routes. */
import { closeDatabase, openDatabase } from '#server/database/connection'
import { migrator } from '#server/database/migrate'
import { initModels } from '#server/database/models/init-models'
import { createTestDatabase } from './database'
import type { TestDatabase } from './database'

export type OpenedDatabase = TestDatabase & { close: () => Promise<void> }

/** @param schema whether the tables are made at once */
export async function openTestDatabase({ schema = true } = {}): Promise<OpenedDatabase> {
  const made = await createTestDatabase()
  initModels(openDatabase(made.url))
  if (schema) await migrator().up()
  return {
    ...made,
    close: async () => {
      await closeDatabase()
      await made.drop()
    },
  }
}
