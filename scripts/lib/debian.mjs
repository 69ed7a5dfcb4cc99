import { accessSync, constants } from 'node:fs'
import { delimiter, join } from 'node:path'
import { run } from './processes.mjs'
import { Refusal, step } from './say.mjs'

// Debian leaves the sbin folders out of an ordinary user's PATH.
const EXTRA_FOLDERS = ['/usr/local/sbin', '/usr/sbin', '/sbin', '/usr/local/bin', '/usr/bin']

/**
 * @param {string} name
 * @returns {string | undefined} its full path
 */
export function findProgram(name) {
  const folders = [...(process.env.PATH ?? '').split(delimiter).filter(Boolean), ...EXTRA_FOLDERS]
  return folders.map(folder => join(folder, name)).find(isExecutable)
}

/** @param {string} path */
function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK)
    return true
  } catch {
    return false
  }
}

/** @returns {Promise<string[] | undefined>} words to put before apt-get, or nothing without the rights */
async function rightsForApt() {
  if (process.getuid?.() === 0) return []
  const sudo = findProgram('sudo')
  if (!sudo) return undefined
  const { code } = await run(sudo, ['-n', 'true'])
  return code === 0 ? [sudo, '-n'] : undefined
}

/**
 * @param {string} what as the person knows it, e.g. "MariaDB"
 * @param {string[]} packages
 */
export async function installDebianPackages(what, packages) {
  const apt = findProgram('apt-get')
  if (!apt) throw new Refusal(`${what} is missing, and this is no Debian that could install it. Put it in place and start again.`)
  const before = await rightsForApt()
  if (!before) throw new Refusal(withoutRights(what, packages))
  await step(`Installing ${what} from Debian's packages`, async () => {
    await aptGet([...before, 'env', 'DEBIAN_FRONTEND=noninteractive', apt], ['update'])
    await aptGet([...before, 'env', 'DEBIAN_FRONTEND=noninteractive', apt], ['install', '-y', '--no-install-recommends', ...packages])
  })
}

/**
 * @param {string} what
 * @param {string[]} packages
 */
function withoutRights(what, packages) {
  return [
    `${what} is missing, and installing it takes rights that this account lacks. Run this once, then start again:`,
    '',
    `  su -c "apt-get update && apt-get install -y --no-install-recommends ${packages.join(' ')}"`,
    '',
    '(or the same with sudo, where it is set up)',
  ].join('\n')
}

/**
 * @param {string[]} command
 * @param {string[]} args
 */
async function aptGet(command, args) {
  const [program = '', ...words] = command
  const { code, lastLines } = await run(program, [...words, ...args], { letFinish: true })
  if (code === 0) return
  throw new Refusal([...lastLines, '', `"apt-get ${args.join(' ')}" failed; its last lines are above.`].join('\n'))
}
