import { get, set } from 'idb-keyval'
import * as z from 'zod/mini'
import { openJournalDatabase } from './database'

const accountSchema = z.object({ id: z.string(), displayName: z.string(), email: z.string() })

/** Who used this phone last, so that their journal opens without asking the server. */
export type RememberedAccount = z.output<typeof accountSchema>

let memory: ReturnType<typeof openJournalDatabase> | null = null

function store() {
  memory ??= openJournalDatabase('stillroot-device', () => undefined)
  return memory.useStore
}

export async function rememberedAccount(): Promise<RememberedAccount | null> {
  return accountSchema.safeParse(await get('account', store())).data ?? null
}

export async function rememberAccount(account: RememberedAccount | null): Promise<void> {
  await set('account', account, store())
}
