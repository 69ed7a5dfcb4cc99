import { promisifyRequest } from 'idb-keyval'
import type { UseStore } from 'idb-keyval'
import { StorageFull, StorageGone } from './ports'

const VERSION = 1
const STORE = 'journal'
/** How often a connection that the browser closed is opened anew before giving up. */
const ATTEMPTS = 3

export type JournalDatabase = {
  /** A store for idb-keyval. */
  useStore: UseStore
  /** Removes the database from the phone. */
  destroy: () => Promise<void>
}

/**
 * A store function for idb-keyval that is fit for a journal: a failed opening
 * is not kept, the connection yields to a newer version in another tab, a
 * connection that the browser dropped is opened again, and writes are on disk
 * before they count (`durability: 'strict'`).
 */
export function openJournalDatabase(name: string, onBlocked: () => void): JournalDatabase {
  let connection: Promise<IDBDatabase> | null = null

  function connect(): Promise<IDBDatabase> {
    connection ??= open().catch((error: unknown) => {
      connection = null
      throw error
    })
    return connection
  }

  async function open(): Promise<IDBDatabase> {
    const request = indexedDB.open(name, VERSION)
    request.onupgradeneeded = (event) => {
      if (event.oldVersion < 1) request.result.createObjectStore(STORE)
    }
    request.onblocked = onBlocked
    const database = await promisifyRequest(request)
    const forget = () => {
      connection = null
    }
    database.onclose = forget
    database.onversionchange = () => {
      database.close()
      forget()
    }
    return database
  }

  const useStore: UseStore = async (mode, work) => {
    for (let attempt = 1; ; attempt += 1) {
      try {
        const transaction = (await connect()).transaction(STORE, mode, { durability: 'strict' })
        return await work(transaction.objectStore(STORE))
      } catch (error) {
        if (!isLostConnection(error)) throw toStorageError(error)
        connection = null
        if (attempt >= ATTEMPTS) throw new StorageGone({ cause: error })
      }
    }
  }

  async function destroy(): Promise<void> {
    const database = await connection?.catch(() => null)
    database?.close()
    connection = null
    await promisifyRequest(indexedDB.deleteDatabase(name))
  }

  return { useStore, destroy }
}

function isLostConnection(error: unknown): boolean {
  return error instanceof DOMException && ['InvalidStateError', 'UnknownError', 'AbortError'].includes(error.name)
}

function toStorageError(error: unknown): unknown {
  const full = error instanceof DOMException && error.name === 'QuotaExceededError'
  return full ? new StorageFull({ cause: error }) : error
}
