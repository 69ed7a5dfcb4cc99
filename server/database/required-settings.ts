import { QueryTypes } from 'sequelize'
import { database } from './connection'

type Settings = Record<string, string>

/**
 * Refuses a database on which an acknowledged entry could be lost or a value
 * be bent to fit: without a flush at commit, a killed server forgets what it
 * had acknowledged; without strict mode, text that is too long is cut.
 *
 * @throws Error that names each setting and what it must be
 */
export async function assertRequiredSettings(): Promise<void> {
  const rows = await database().query<{ Variable_name: string, Value: string }>(
    `SHOW VARIABLES WHERE Variable_name IN
      ('innodb_flush_log_at_trx_commit', 'sql_mode', 'character_set_database', 'default_storage_engine')`,
    { type: QueryTypes.SELECT },
  )
  const problems = settingProblems(Object.fromEntries(rows.map(row => [row.Variable_name, row.Value])))
  if (problems.length > 0) throw new Error(`The database is not safe to use: ${problems.join('; ')}`)
}

/** Says what is wrong with these settings, in words; empty when all is well. */
export function settingProblems(settings: Settings): string[] {
  const problems: string[] = []
  if (settings.innodb_flush_log_at_trx_commit !== '1') problems.push('innodb_flush_log_at_trx_commit must be 1')
  if (!/STRICT_(?:TRANS|ALL)_TABLES/.test(settings.sql_mode ?? '')) problems.push('sql_mode must be strict')
  if (settings.character_set_database !== 'utf8mb4') problems.push('the character set must be utf8mb4')
  if (settings.default_storage_engine !== 'InnoDB') problems.push('the storage engine must be InnoDB')
  return problems
}
