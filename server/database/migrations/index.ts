import type { QueryInterface } from 'sequelize'
import * as initial from './0001-initial'

/** A step of the schema and the way back. */
export type Migration = {
  up: (queryInterface: QueryInterface) => Promise<void>
  down: (queryInterface: QueryInterface) => Promise<void>
}

/** In the order in which they run. A name, once released, never changes. */
export const migrations: { name: string, migration: Migration }[] = [
  { name: '0001-initial', migration: initial },
]
