import { randomBytes } from 'node:crypto'
import { createConnection } from 'mariadb'
import { fromTestCommand } from './environment'

export interface TestDatabase {
  name: string
  url: string
  /** Runs statements as the administrator of the test server, with this database chosen. */
  query: (sql: string, values?: unknown[]) => Promise<unknown>
  drop: () => Promise<void>
}

/** An empty database that no other test file knows. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const adminUrl = fromTestCommand('STILLROOT_TEST_DATABASE_ADMIN_URL')
  const name = `stillroot_test_${randomBytes(6).toString('hex')}`
  const url = new URL(name, adminUrl).href
  await runOn(adminUrl, `CREATE DATABASE ${name}`)
  return {
    name,
    url,
    query: (sql, values) => runOn(url, sql, values),
    drop: async () => { await runOn(adminUrl, `DROP DATABASE IF EXISTS ${name}`) },
  }
}

export async function runOn(url: string, sql: string, values: unknown[] = []): Promise<unknown> {
  const { hostname, port, username, password, pathname } = new URL(url)
  const connection = await createConnection({
    host: hostname,
    port: Number(port),
    user: decodeURIComponent(username),
    password: decodeURIComponent(password),
    database: pathname.slice(1) || undefined,
  })
  try {
    return await connection.query(sql, values)
  } finally {
    await connection.end()
  }
}
