import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { projectRoot } from './paths.mjs'

/** @typedef {{ email: string, password: string, displayName: string, role: string, about: string }} DemoAccount */

/** @returns {DemoAccount[]} */
function demoAccounts() {
  const file = join(projectRoot, 'server/demo/accounts.json')
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : []
}

/** @returns {string[]} lines for the terminal, none without accounts */
export function accountLines() {
  const accounts = demoAccounts()
  if (accounts.length === 0) return []
  const rows = accounts.map(account => [account.displayName, account.role, account.email, account.password])
  const widths = [0, 1, 2, 3].map(column => Math.max(...rows.map(row => row[column]?.length ?? 0)))
  const lines = accounts.flatMap((account, index) => [
    `  ${rows[index]?.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('   ').trimEnd()}`,
    ...(account.about ? [`      ${account.about}`] : []),
  ])
  return ['', 'Sign in as (name, role, e-mail, password):', ...lines]
}
