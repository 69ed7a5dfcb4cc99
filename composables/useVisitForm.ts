import { computed, onMounted, ref } from 'vue'
import type { Entry } from '#shared/domain/entry.schema'
import type { Plant } from '#shared/domain/plant.schema'
import type { ChosenPhoto } from '~/stores/entries'
import { useEntriesStore } from '~/stores/entries'
import { usePhotosStore } from '~/stores/photos'
import { usePlantsStore } from '~/stores/plants'
import type { SaveOutcome, View } from '~/types/view'
import { isoOf } from '~/utils/offline/journal'
import { changedFields, emptyLogForm, fromEntry, isEmptyForm, logFormSchema, toEntryFields } from '~/utils/log/log-form'
import { useDraftPhotos } from './useDraftPhotos'
import { useEntryProblems } from './useEntryProblems'
import { useLogDraft } from './useLogDraft'
import { useNow } from './useNow'
import { useVisitHints } from './useVisitHints'

const NOTHING_YET = 'There is nothing to save yet. Add a photo, a reading, what was done or a note.'

/**
 * The form of one visit, new or written before: its draft, its photos, what it
 * tells beside its fields, and saving. Nothing typed leaves the screen before
 * the phone has it.
 */
export function useVisitForm(plant: View<Plant>, entry: View<Entry> | null) {
  const plants = usePlantsStore()
  const entries = useEntriesStore()
  const savedPhotos = usePhotosStore()
  const { timeZone } = plant.data
  const now = useNow()
  const blank = () => (entry ? fromEntry(entry.data, timeZone) : emptyLogForm())
  const form = ref(blank())
  const ready = ref(false)
  const saving = ref(false)

  const draftId = entry ? `entry-${entry.id}` : plant.id
  const draft = useLogDraft(draftId, form, logFormSchema)
  const photos = useDraftPhotos(draftId, form, () => (entry ? savedPhotos.ofEntry(entry.id).length : 0))
  const problems = useEntryProblems()
  const hints = useVisitHints(computed(() => plants.byId(plant.id) ?? plant), form, now, entry?.id ?? null)
  /** True when a draft was taken up that says something. */
  const resumed = ref(false)

  onMounted(async () => {
    await draft.restore()
    await photos.restore()
    resumed.value = draft.restored.value && JSON.stringify(form.value) !== JSON.stringify(blank())
    ready.value = true
  })

  async function startAgain(): Promise<void> {
    for (const photo of [...photos.picked.value]) await photos.remove(photo.key)
    form.value = blank()
    resumed.value = false
  }

  function write(chosen: ChosenPhoto[]): Promise<SaveOutcome> {
    const visit = { plantId: plant.id, timeZone, now: isoOf(now.value.getTime()) }
    return entry
      ? entries.change(entry.id, changedFields(entry.data, form.value, visit), chosen)
      : entries.create(toEntryFields(form.value, visit), chosen)
  }

  /** Saves on the phone. Null when it was not saved; the fields say why. */
  async function save(): Promise<string | null> {
    if (saving.value) return null
    saving.value = true
    try {
      const chosen = await photos.chosen()
      if (problems.findUnreadable()) return null
      if (isEmptyForm(form.value) && !(entry && savedPhotos.ofEntry(entry.id).length > 0)) {
        problems.show([{ path: 'note', message: NOTHING_YET }])
        return null
      }
      await draft.end()
      const outcome = await write(chosen)
      problems.showOutcome(outcome)
      if (!outcome.ok) {
        draft.resume()
        return null
      }
      await photos.forgetAll()
      if (entry) await draft.discard()
      return outcome.id
    } finally {
      saving.value = false
    }
  }

  /** The most frequent visit: somebody looked and nothing was odd. What was typed besides goes with it. */
  async function look(): Promise<string | null> {
    form.value.lookedNoChange = true
    const id = await save()
    if (id === null) form.value.lookedNoChange = false
    return id
  }

  return { form, now, ready, saving, resumed, photos, problems, hints, startAgain, save, look }
}
