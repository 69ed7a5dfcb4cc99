import { DataTypes } from 'sequelize'
import { SequelizeStorage, Umzug } from 'umzug'
import { database } from './connection'
import { migrations } from './migrations'

/**
 * The steps of the schema, named in a table of the database. They are imported
 * rather than read from a folder, so that a bundled server carries them.
 */
export function migrator() {
  const sequelize = database()
  const names = sequelize.define('applied_migration', {
    name: { type: DataTypes.STRING(100), primaryKey: true },
  }, { tableName: 'applied_migration', timestamps: false })
  return new Umzug({
    migrations: migrations.map(({ name, migration }) => ({
      name,
      up: async () => migration.up(sequelize.getQueryInterface()),
      down: async () => migration.down(sequelize.getQueryInterface()),
    })),
    storage: new SequelizeStorage({ sequelize, model: names }),
    logger: undefined,
  })
}
