import { defineStore } from 'pinia'
import { computed } from 'vue'
import type { Plant, PlantFields } from '#shared/domain/plant.schema'
import type { Vessel, VesselFields } from '#shared/domain/vessel.schema'
import type { ChangeRequest } from '#shared/sync/outbox'
import { useSave } from '~/composables/useSave'
import type { SaveOutcome, View } from '~/types/view'
import { useJournalStore } from './journal'

/** Plants and the vessels they stand in. */
export const usePlantsStore = defineStore('plants', () => {
  const journal = useJournalStore()
  const { save, newId } = useSave()

  const everything = computed(() => [...journal.shelves.plant.values()]
    .sort((left, right) => right.data.setUpOn.localeCompare(left.data.setUpOn) || left.data.name.localeCompare(right.data.name)))
  const isMine = (plant: View<Plant>) => plant.data.ownerId === journal.phone?.accountId

  const own = computed(() => everything.value.filter(isMine))
  /** Plants of others that a club of mine shares. */
  const shared = computed(() => everything.value.filter(plant => !isMine(plant)))
  const vessels = computed(() => [...journal.shelves.vessel.values()]
    .filter(vessel => vessel.data.ownerId === journal.phone?.accountId)
    .sort((left, right) => left.data.name.localeCompare(right.data.name)))

  const byId = (id: string): View<Plant> | null => journal.shelves.plant.get(id) ?? null
  const vesselById = (id: string | null): View<Vessel> | null => (id ? journal.shelves.vessel.get(id) ?? null : null)

  /** Makes a plant, and its vessel with it when one is described. */
  async function create(fields: PlantFields, vessel: VesselFields | null): Promise<SaveOutcome> {
    const plantId = newId()
    const vesselId = vessel ? newId() : fields.vesselId
    const requests: ChangeRequest[] = [
      { kind: 'create', entityType: 'plant', entityId: plantId, fields: { ...fields, vesselId } },
    ]
    if (vessel && vesselId) requests.push({ kind: 'create', entityType: 'vessel', entityId: vesselId, fields: { ...vessel } })
    const outcome = await save(requests.reverse())
    return outcome.ok ? { ok: true, id: plantId } : outcome
  }

  /**
   * Changes a plant and what it stands in, in one step on the phone. A vessel
   * without an id is new and the plant moves into it.
   */
  function revise(id: string, fields: Partial<PlantFields>, vessel: { id: string | null, fields: Partial<VesselFields> } | null): Promise<SaveOutcome> {
    const requests: ChangeRequest[] = []
    const moved = { ...fields }
    if (vessel?.id === null) {
      moved.vesselId = newId()
      requests.push({ kind: 'create', entityType: 'vessel', entityId: moved.vesselId, fields: { ...vessel.fields } })
    } else if (vessel?.id && Object.keys(vessel.fields).length > 0) {
      requests.push({ kind: 'patch', entityType: 'vessel', entityId: vessel.id, fields: { ...vessel.fields } })
    }
    if (Object.keys(moved).length > 0) requests.push({ kind: 'patch', entityType: 'plant', entityId: id, fields: moved })
    return requests.length > 0 ? save(requests) : Promise.resolve({ ok: true, id })
  }

  const change = (id: string, fields: Partial<PlantFields>): Promise<SaveOutcome> => (
    save([{ kind: 'patch', entityType: 'plant', entityId: id, fields: { ...fields } }])
  )
  const changeVessel = (id: string, fields: Partial<VesselFields>): Promise<SaveOutcome> => (
    save([{ kind: 'patch', entityType: 'vessel', entityId: id, fields: { ...fields } }])
  )
  const remove = (id: string): Promise<SaveOutcome> => save([{ kind: 'delete', entityType: 'plant', entityId: id, fields: {} }])

  return { own, shared, vessels, byId, vesselById, isMine, create, revise, change, changeVessel, remove }
})
