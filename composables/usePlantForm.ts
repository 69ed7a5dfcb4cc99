import { computed, ref } from 'vue'
import { localDay } from '#shared/science/time/day-number'
import { usePlantsStore } from '~/stores/plants'
import { checkPlantForm, emptyPlantForm, freeName, PLANT_FORM_NAMES } from '~/utils/plant/plant-form'
import type { CheckedPlantForm, PlantForm } from '~/utils/plant/plant-form'
import type { PlantFields } from '#shared/domain/plant.schema'
import type { SaveOutcome } from '~/types/view'
import { errorsByField, summaryOf } from '~/utils/words/issues'
import { VESSEL_KIND_WORDS } from '~/utils/words/names'

type Rest = Pick<PlantFields, 'timeZone' | 'endedOn' | 'endReason'>

/** The form that sets up or changes a plant and its vessel. */
export function usePlantForm(start?: PlantForm, rest?: Rest) {
  const plants = usePlantsStore()
  const { timeZone } = Intl.DateTimeFormat().resolvedOptions()
  const form = ref<PlantForm>(start ?? emptyPlantForm(localDay(new Date().toISOString(), timeZone)))
  const issues = ref<{ path: string, message: string }[]>([])
  const message = ref<string | null>(null)
  const busy = ref(false)
  const unreadable = ref<string[]>([])
  const askedForVessel = ref(false)

  /** An error leaves its field once it is put right; the list at the top stays until the next try. */
  const errors = computed(() => {
    if (issues.value.length === 0) return {}
    const open = new Set(problems(askedForVessel.value).issues.map(issue => issue.path))
    return errorsByField(issues.value.filter(issue => open.has(issue.path)), PLANT_FORM_NAMES)
  })
  const summary = computed(() => summaryOf(issues.value, PLANT_FORM_NAMES))
  const suggestedName = computed(() => {
    const { kind } = form.value.vessel
    return freeName(kind === 'other' ? 'Vessel' : VESSEL_KIND_WORDS[kind], plants.vessels.map(vessel => vessel.data.name))
  })

  function setUnreadable(path: string, is: boolean): void {
    unreadable.value = is ? [...new Set([...unreadable.value, path])] : unreadable.value.filter(other => other !== path)
  }

  function problems(withVessel: boolean) {
    const checked = checkPlantForm(form.value, rest ?? { timeZone, endedOn: null, endReason: null }, suggestedName.value, withVessel)
    const typed = unreadable.value.map(path => ({ path, message: 'is not a number' }))
    return { checked, issues: checked.ok ? typed : [...typed, ...checked.issues] }
  }

  /** Checks the form and saves it; null while something in it needs another look. */
  async function submit(
    withVessel: boolean, store: (checked: Extract<CheckedPlantForm, { ok: true }>) => Promise<SaveOutcome>,
  ): Promise<string | null> {
    if (busy.value) return null
    message.value = null
    askedForVessel.value = withVessel
    const { checked, issues: found } = problems(withVessel)
    issues.value = found
    if (!checked.ok || found.length > 0) return null
    busy.value = true
    const outcome = await store(checked)
    busy.value = false
    if (outcome.ok) return outcome.id
    issues.value = outcome.issues
    message.value = outcome.message
    return null
  }

  return { form, errors, summary, message, busy, suggestedName, setUnreadable, submit }
}
