/**
 * Takes every mail the app sends and keeps it as a file, so that links can be followed without a mail account.
 */
import { mkdirSync, renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/** @typedef {{ port: number, stop: () => Promise<void> }} MailCatcher */

/** @param {import('node:stream').Readable} stream */
async function readAll(stream) {
  const chunks = []
  for await (const chunk of stream) chunks.push(chunk)
  return Buffer.concat(chunks)
}

/**
 * @param {string} folder
 * @returns {(message: Buffer) => void}
 */
function messageWriter(folder) {
  let count = 0
  return (message) => {
    count += 1
    // The names sort in the order of arrival, also within one millisecond.
    const moment = new Date().toISOString().replaceAll(/[-:]/g, '')
    const name = `${moment}-${String(count).padStart(4, '0')}`
    // Whoever watches the folder must never see half a message.
    writeFileSync(join(folder, `.${name}.part`), message, { mode: 0o600 })
    renameSync(join(folder, `.${name}.part`), join(folder, `${name}.eml`))
  }
}

/**
 * @param {string} folder
 * @returns {Promise<MailCatcher>}
 */
export async function startMailCatcher(folder) {
  // Loaded here and not at the top: on a bare clone the package is not there yet when this file is read.
  const { SMTPServer } = await import('smtp-server')
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  const write = messageWriter(folder)
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    logger: false,
    onData(stream, _session, done) {
      readAll(stream).then(write).then(() => done(), done)
    },
  })
  await new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(0, '127.0.0.1', () => resolve(undefined))
  })
  const address = server.server.address()
  const port = address !== null && typeof address === 'object' ? address.port : 0
  return { port, stop: () => new Promise(resolve => server.close(() => resolve())) }
}
