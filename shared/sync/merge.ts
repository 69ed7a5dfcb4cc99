/**
 * Field-level merging. Guarantees: a value is only replaced by a writer who was
 * shown it, or by the device that wrote it; every other value is kept beside
 * the one that stands. No clock takes part.
 */

/** One field as it was before and after a change. */
export type FieldChange = { from: unknown, to: unknown }

/** One change in the history of a record, as far as merging needs it. */
export type HistoryChange = {
  ver: number
  fields: Record<string, FieldChange>
}

/** Fields that are sets: two devices' additions and removals both count. */
const SET_FIELDS: readonly string[] = ['actions']

export type PatchDecision = {
  /** What the record takes on, by field. */
  apply: Record<string, unknown>
  /** What was written without knowing of the value that stands: kept, not applied. */
  kept: Record<string, unknown>
  /** True when another device had changed other fields meanwhile. */
  merged: boolean
}

/**
 * Decides what becomes of each field of a patch.
 *
 * @param current the record's fields as they stand
 * @param patch the fields that the writer set
 * @param unseen what other devices changed after the version the writer was shown, oldest first
 */
export function decidePatch(
  current: Record<string, unknown>,
  patch: Record<string, unknown>,
  unseen: HistoryChange[],
): PatchDecision {
  const decision: PatchDecision = { apply: {}, kept: {}, merged: unseen.some(change => Object.keys(change.fields).length > 0) }
  for (const [field, value] of Object.entries(patch)) {
    if (sameValue(current[field], value)) continue
    const first = unseen.find(change => field in change.fields)?.fields[field]
    if (!first) decision.apply[field] = value
    else if (SET_FIELDS.includes(field)) decision.apply[field] = mergeSets(first.from, current[field], value)
    else decision.kept[field] = value
  }
  return decision
}

/** What was added to or removed from `base` by the writer, done to `current`. */
function mergeSets(base: unknown, current: unknown, written: unknown): unknown[] {
  const before = asList(base)
  const wanted = asList(written)
  const removed = before.filter(item => !wanted.includes(item))
  const added = wanted.filter(item => !before.includes(item))
  const kept = asList(current).filter(item => !removed.includes(item))
  return [...kept, ...added.filter(item => !kept.includes(item))]
}

function asList(value: unknown): unknown[] {
  return Array.isArray(value) ? value : []
}

/** Equality of the plain values that records hold; lists are sets. */
export function sameValue(left: unknown, right: unknown): boolean {
  if (Array.isArray(left) && Array.isArray(right)) {
    return left.length === right.length && left.every(item => right.includes(item))
  }
  return Object.is(left, right)
}
