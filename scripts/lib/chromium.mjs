import { findProgram, installDebianPackages } from './debian.mjs'
import { Refusal } from './say.mjs'

/** @returns {Promise<string>} the path of a Chromium to drive */
export async function ensureChromium() {
  const present = process.env.STILLROOT_CHROMIUM ?? findProgram('chromium')
  if (present) return present
  await installDebianPackages('Chromium', ['chromium'])
  const installed = findProgram('chromium')
  if (!installed) throw new Refusal('Chromium was installed, but its program is not to be found.')
  return installed
}
