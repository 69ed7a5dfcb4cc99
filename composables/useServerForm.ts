import { computed, ref } from 'vue'
import { checkWith } from '#shared/sync/record-schemas'
import type * as z from 'zod/mini'
import type { FormAnswer } from '~/utils/offline/account-api'
import { errorsByField } from '~/utils/words/issues'
import type { FieldNames } from '~/utils/words/issues'

type Issue = { path: string, message: string }

/**
 * A form that needs the server: checked with the schema of its route before it
 * is sent, and with the server's issues at its fields afterwards. What was typed
 * stays, whatever the answer is.
 */
export function useServerForm(names: FieldNames) {
  const issues = ref<Issue[]>([])
  const message = ref<string | null>(null)
  const code = ref<string | null>(null)
  const busy = ref(false)
  const errors = computed(() => errorsByField(issues.value, names))

  async function submit<F, T>(schema: z.ZodMiniType<F>, fields: F, send: (fields: F) => Promise<FormAnswer<T>>): Promise<T | null> {
    if (busy.value) return null
    message.value = null
    code.value = null
    const checked = checkWith(schema, fields)
    issues.value = checked.ok ? [] : checked.issues
    if (!checked.ok) return null
    busy.value = true
    const answer = await send(fields)
    busy.value = false
    if (answer.ok) return answer.body
    issues.value = answer.issues
    code.value = answer.code
    message.value = answer.message
    return null
  }

  return { issues, errors, message, code, busy, submit }
}
