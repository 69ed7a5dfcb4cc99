import { createServer } from 'node:net'

const LAST_PORT = 65_535

/**
 * @param {number} port 0 lets the system choose
 * @param {string} host
 * @returns {Promise<number | undefined>} the port, or nothing when it is taken
 */
export function tryPort(port, host) {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', (/** @type {NodeJS.ErrnoException} */ error) => {
      // Below 1024 only the superuser may listen: for the caller as good as taken.
      if (error.code === 'EADDRINUSE' || error.code === 'EACCES') resolve(undefined)
      else reject(error)
    })
    probe.listen({ port, host, exclusive: true }, () => {
      const address = probe.address()
      const given = address !== null && typeof address === 'object' ? address.port : undefined
      probe.close(() => resolve(given))
    })
  })
}

export async function freePort(host = '127.0.0.1') {
  const port = await tryPort(0, host)
  if (port === undefined) throw new Error(`No free port on ${host}`)
  return port
}

/**
 * @param {number} preferred
 * @param {string} host
 */
export async function firstFreePort(preferred, host) {
  for (let port = preferred; port <= LAST_PORT; port += 1) {
    if (await tryPort(port, host) !== undefined) return port
  }
  throw new Error(`No free port from ${preferred} up on ${host}`)
}
