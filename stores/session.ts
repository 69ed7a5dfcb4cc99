import { defineStore } from 'pinia'
import { computed, ref, shallowRef } from 'vue'
import * as z from 'zod/mini'
import type { Account, SignIn, SignUp } from '#shared/domain/account.schema'
import { request } from '~/utils/offline/account-api'
import type { FormAnswer } from '~/utils/offline/account-api'
import { rememberAccount, rememberedAccount } from '~/utils/offline/device-memory'
import { useJournalStore } from './journal'

const accountSchema = z.object({ id: z.string(), displayName: z.string(), email: z.string() })
const answerSchema = z.object({ account: accountSchema })
const meSchema = z.object({ account: z.nullable(accountSchema) })

/** How long the start may wait for the server's word on who is signed in. */
const ASK_MILLISECONDS = 5_000

/**
 * Who uses this phone. The journal opens for the account it remembers, without
 * waiting for the server; a server that does not answer is not a sign-out.
 */
export const useSessionStore = defineStore('session', () => {
  const journal = useJournalStore()
  const account = shallowRef<Account | null>(null)
  /** True when the server said that the session is over: entries are kept and wait. */
  const expired = ref(false)
  const signedIn = computed(() => account.value !== null)
  let starting: Promise<void> | null = null

  /** Opens the journal of the remembered account, then asks the server whether it is still signed in. */
  function start(): Promise<void> {
    starting ??= (async () => {
      const remembered = await rememberedAccount().catch(() => null)
      if (remembered) await use(remembered)
      const asked = askServer()
      if (!remembered) await asked
    })()
    return starting
  }

  async function askServer(): Promise<void> {
    const answer = await request('GET', '/api/auth/me', meSchema, undefined, ASK_MILLISECONDS)
    if (!answer.ok) return
    const { account: known } = answer.body
    if (!known) expired.value = account.value !== null
    else if (known.id !== account.value?.id) await use(known)
    else await rememberAccount(known)
  }

  async function use(next: Account): Promise<void> {
    await rememberAccount(next).catch(() => undefined)
    if (account.value?.id !== next.id) await journal.open(next.id)
    account.value = next
    expired.value = false
    journal.phone?.runner.kick()
  }

  async function enter(answer: FormAnswer<{ account: Account }>): Promise<FormAnswer<{ account: Account }>> {
    if (answer.ok) await use(answer.body.account)
    return answer
  }
  const signIn = async (form: SignIn) => enter(await request('POST', '/api/auth/sign-in', answerSchema, form))
  const signUp = async (form: SignUp) => enter(await request('POST', '/api/auth/sign-up', answerSchema, form))

  /**
   * Ends the session and removes the journal from this phone. Call it only when
   * nothing waits, or when the person said that what waits may go.
   */
  async function signOut(): Promise<FormAnswer<unknown>> {
    const answer = await request('POST', '/api/auth/sign-out', z.unknown(), {})
    if (!answer.ok) return answer
    const { phone } = journal
    journal.close()
    await phone?.storage.destroy()
    await rememberAccount(null)
    account.value = null
    expired.value = false
    return answer
  }

  return { account, expired, signedIn, start, signIn, signUp, signOut }
})
