import type { FieldIssue } from '~/types/ui'

type Issue = { path: string, message: string }

/** What the fields of a form are called, by the path that an issue names. */
export type FieldNames = Readonly<Record<string, string>>

/** "Password is shorter than 10 characters." An issue of the whole form stands alone. */
export function issueWords(issue: Issue, names: FieldNames): string {
  const name = names[issue.path] ?? names[issue.path.split('.')[0] ?? '']
  return name ? `${name} ${issue.message}.` : `Something in it ${issue.message}.`
}

/** The first sentence for each field, to stand below it. */
export function errorsByField(issues: readonly Issue[], names: FieldNames): Partial<Record<string, string>> {
  const errors: Partial<Record<string, string>> = {}
  for (const issue of issues) errors[issue.path] ??= issueWords(issue, names)
  return errors
}

/** The same for the summary of a form, whose fields carry their path as id. */
export function summaryOf(issues: readonly Issue[], names: FieldNames): FieldIssue[] {
  return Object.entries(errorsByField(issues, names)).flatMap(([fieldId, message]) => (message ? [{ fieldId, message }] : []))
}
