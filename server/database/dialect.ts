import * as mariadb from 'mariadb'

type Connection = Awaited<ReturnType<typeof mariadb.createConnection>>

/**
 * The driver as Sequelize 6 expects it. Imported by name, because a bundled
 * server cannot find a driver that is named at run time. Since 3.1 the driver
 * puts a fixed `meta` property on its rows, which Sequelize tries to delete;
 * plain copies of the rows may be changed.
 */
export const dialectModule = {
  ...mariadb,
  createConnection: async (options: mariadb.ConnectionConfig): Promise<Connection> => {
    const connection = await mariadb.createConnection(options)
    const query = connection.query.bind(connection)
    connection.query = async <T>(sql: string | mariadb.QueryOptions, values?: unknown): Promise<T> => (
      withPlainMeta(await query<T>(sql, values))
    )
    return connection
  },
}

function withPlainMeta<T>(result: T): T {
  if (!Array.isArray(result)) return result
  const copy = Object.assign([], result)
  Object.defineProperty(copy, 'meta', {
    value: Reflect.get(result, 'meta'), configurable: true, enumerable: false, writable: true,
  })
  return copy
}
