/**
 * Who may sign in to the private database server. Run at every start, so a changed password file just works.
 */

// The data folder is born with password-less root accounts for several host names. Two statements, since
// accounts changed directly in the table count only after the flush.
const CLOSE_OPEN_ACCOUNTS = [
  'DELETE FROM mysql.global_priv WHERE User IN (\'\', \'root\')',
  'FLUSH PRIVILEGES',
]

/** @param {string} text */
function quoted(text) {
  // Secrets are base64url, which has nothing to escape; anything else would be a mistake of ours.
  if (!/^[\w-]+$/.test(text)) throw new Error('Unexpected character in a database name, user or password')
  return `'${text}'`
}

/**
 * One database and one account that may use nothing else.
 * @param {{ database: string, user: string, password: string }} account
 */
export function appAccountStatements({ database, user, password }) {
  const who = `${quoted(user)}@'127.0.0.1'`
  return [
    ...CLOSE_OPEN_ACCOUNTS,
    `CREATE DATABASE IF NOT EXISTS ${database} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`,
    `CREATE OR REPLACE USER ${who} IDENTIFIED BY ${quoted(password)}`,
    `GRANT ALL ON ${database}.* TO ${who}`,
  ]
}

/**
 * An administrator for test servers: every test file makes a database of its own.
 * @param {string} password
 */
export function adminAccountStatements(password) {
  return [
    ...CLOSE_OPEN_ACCOUNTS,
    `CREATE OR REPLACE USER 'root'@'127.0.0.1' IDENTIFIED BY ${quoted(password)}`,
    'GRANT ALL ON *.* TO \'root\'@\'127.0.0.1\' WITH GRANT OPTION',
  ]
}
