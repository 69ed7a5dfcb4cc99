import { AsyncLocalStorage } from 'node:async_hooks'
import { Sequelize } from 'sequelize'
import { dialectModule } from './dialect'

/**
 * Sequelize asks this namespace for the transaction that is going on, so that
 * every query inside `inTransaction` takes part in it without being told.
 */
const namespaceStore = new AsyncLocalStorage<Map<string, unknown>>()
const namespace = {
  get: (key: string) => namespaceStore.getStore()?.get(key),
  set: (key: string, value: unknown) => namespaceStore.getStore()?.set(key, value),
  run: <T>(work: (context: unknown) => T) => (
    namespaceStore.run(new Map(namespaceStore.getStore()), () => work(undefined))
  ),
  bind: <T>(work: T) => work,
}
Sequelize.useCLS(namespace)

let sequelize: Sequelize | null = null

/** Opens the pool. Nothing is sent before the first query. */
export function openDatabase(url: string): Sequelize {
  sequelize = new Sequelize(url, {
    dialect: 'mariadb',
    dialectModule,
    logging: false,
    timezone: '+00:00',
    isolationLevel: 'READ COMMITTED',
    define: { underscored: true, timestamps: false, freezeTableName: true },
    // JSON comes as text and is read by us: the driver's own reading cannot tell the text "12" from the number.
    dialectOptions: { autoJsonMap: false, connectTimeout: 5_000, bigIntAsNumber: true, insertIdAsNumber: true, checkDuplicate: false },
    pool: { max: 12, min: 0, acquire: 10_000, idle: 30_000 },
  })
  return sequelize
}

/** @throws Error when nobody opened the database: a fault in the order of starting. */
export function database(): Sequelize {
  if (!sequelize) throw new Error('the database was used before it was opened')
  return sequelize
}

export async function closeDatabase(): Promise<void> {
  await sequelize?.close()
  sequelize = null
}
