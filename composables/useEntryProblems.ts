import { computed, reactive, ref } from 'vue'
import type { FieldIssue } from '~/types/ui'
import type { SaveOutcome } from '~/types/view'
import { entryFieldName, issueSentence } from '~/utils/log/issue-words'
import { fieldIdOf } from '~/utils/log/log-form'

type Issue = { path: string, message: string }

/** What keeps a visit from being saved, at its field and in a list. */
export function useEntryProblems() {
  const issues = ref<Issue[]>([])
  /** Said when the phone did not take it though every field is fine. */
  const failure = ref<string | null>(null)
  const unreadable = reactive(new Set<string>())

  const sentenceOf = ({ path, message }: Issue) => (/[.!?]$/.test(message) ? message : issueSentence(path, message))
  const errors = computed<Record<string, string>>(() => Object.fromEntries(issues.value.map(issue => [issue.path, sentenceOf(issue)])))
  const summary = computed<FieldIssue[]>(() => issues.value.map(issue => ({ fieldId: fieldIdOf(issue.path), message: sentenceOf(issue) })))

  function setUnreadable(path: string, is: boolean): void {
    if (is) unreadable.add(path)
    else unreadable.delete(path)
  }

  /** True when something typed is no number: saving would silently leave it out. */
  function findUnreadable(): boolean {
    show([...unreadable].map(path => ({ path, message: `${entryFieldName(path)}: what is typed there is not a number.` })))
    return unreadable.size > 0
  }

  function show(next: Issue[]): void {
    issues.value = next
    failure.value = null
  }

  function showOutcome(outcome: SaveOutcome): void {
    if (outcome.ok) return show([])
    show(outcome.issues.filter(issue => issue.path !== ''))
    if (issues.value.length === 0) failure.value = outcome.message
  }

  return { errors, summary, failure, setUnreadable, findUnreadable, show, showOutcome }
}
