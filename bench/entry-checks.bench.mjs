/**
 * What it costs to trust nothing: every record is checked with its schema at each border it crosses. The
 * yardstick is reading the same records from JSON, which has to be done in any case.
 */
import { loadTypescript } from '../scripts/lib/load-typescript.mjs'

const ENTRIES = 1_000

export const name = `Checking ${ENTRIES} entries, about ten plants for a season`

const { checkOpFields } = await loadTypescript('shared/sync/record-schemas.ts')
const { emptyEntryFields } = await loadTypescript('shared/domain/entry.schema.ts')

/** @param {number} index */
function entryFields(index) {
  const moment = new Date(Date.UTC(2026, 3, 1) + index * 7_200_000).toISOString()
  return {
    ...emptyEntryFields,
    plantId: '01970000-0000-7000-8000-000000000001',
    recordedAt: moment,
    occurredAt: moment,
    note: 'Water a finger lower, new white roots under the cup.',
    ph: 5.5 + (index % 10) / 10,
    ecMilliSiemensPerCm: 1.2 + (index % 7) / 10,
    waterLevelCm: 20 - index % 12,
    actions: ['topped-up'],
    topUpLitres: 1.5,
    topUpWith: 'half-strength',
  }
}

const json = JSON.stringify(Array.from({ length: ENTRIES }, (_, index) => entryFields(index)))

/**
 * @template T
 * @param {() => T} work
 */
function timed(work) {
  const started = performance.now()
  const result = work()
  return { milliseconds: performance.now() - started, result }
}

export function run() {
  const reading = timed(() => JSON.parse(json))
  const checking = timed(() => reading.result.map(fields => checkOpFields({ kind: 'create', entityType: 'entry', fields })))
  const refused = checking.result.filter(checked => !checked.ok)
  if (refused.length > 0) throw new Error(`The bench measures refusals: ${JSON.stringify(refused[0])}`)
  return [
    { label: 'reading from JSON', value: reading.milliseconds, unit: 'ms' },
    { label: 'checking with the schema', value: checking.milliseconds, unit: 'ms' },
  ]
}
