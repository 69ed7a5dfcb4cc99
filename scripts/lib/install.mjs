/**
 * Brings node_modules in line with package-lock.json. Needs no package itself.
 */
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { projectRoot } from './paths.mjs'
import { run } from './processes.mjs'
import { Refusal, step } from './say.mjs'

const NODE_MINIMUM = [20, 19]
const lockFile = join(projectRoot, 'package-lock.json')
const stampFile = join(projectRoot, 'node_modules/.stillroot-lock-hash')
const npmRecord = join(projectRoot, 'node_modules/.package-lock.json')
const nuxtTypes = join(projectRoot, '.nuxt/tsconfig.json')

export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  const [wantedMajor = 0, wantedMinor = 0] = NODE_MINIMUM
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return
  throw new Refusal(`Stillroot needs Node ${NODE_MINIMUM.join('.')} or newer; this is ${process.versions.node}.`)
}

function lockHash() {
  return createHash('sha256').update(readFileSync(lockFile)).digest('hex')
}

/**
 * Whether somebody's own `npm ci` already laid out what the lock asks for.
 * @returns {boolean}
 */
function installedByHand() {
  if (!existsSync(npmRecord) || !existsSync(nuxtTypes)) return false
  const wanted = JSON.parse(readFileSync(lockFile, 'utf8')).packages
  const present = JSON.parse(readFileSync(npmRecord, 'utf8')).packages
  return Object.entries(wanted).every(([path, entry]) =>
    path === '' || entry.optional || present[path]?.version === entry.version)
}

function npmCommand() {
  const cli = process.env.npm_execpath
  return cli?.endsWith('npm-cli.js') ? { program: process.execPath, args: [cli] } : { program: 'npm', args: [] }
}

export async function ensurePackages() {
  checkNode()
  const hash = lockHash()
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === hash) return
  if (!installedByHand()) await step('Installing the locked packages (about a minute)', cleanInstall)
  writeFileSync(stampFile, hash)
}

async function cleanInstall() {
  const npm = npmCommand()
  // Modules the build loads are development packages, which a production environment would leave out.
  const args = [...npm.args, 'ci', '--include=dev', '--no-audit', '--no-fund']
  const { code, lastLines } = await run(npm.program, args)
  if (code === 0) return
  throw new Refusal([...lastLines, '', 'The packages could not be installed. The npm registry must be reachable for this step.'].join('\n'))
}
