import * as z from 'zod/mini'
import type { PlantFields } from '#shared/domain/plant.schema'
import { plantFieldsSchema } from '#shared/domain/plant.schema'
import type { VesselFields } from '#shared/domain/vessel.schema'
import { emptyVesselFields, VESSEL_KINDS, VESSEL_SHAPES, vesselFieldsSchema } from '#shared/domain/vessel.schema'
import { CROP_IDS } from '#shared/science/crops/crop-ids'
import { checkWith } from '#shared/sync/record-schemas'
import { PLANT_FIELD_WORDS, VESSEL_FIELD_WORDS } from '~/utils/words/fields'
import type { FieldNames } from '~/utils/words/issues'

const measure = z.nullable(z.number())

/** A plant and its vessel as they are being typed. Anything goes here that a draft may hold. */
export const plantFormSchema = z.object({
  name: z.string(),
  cropId: z.nullable(z.enum(CROP_IDS)),
  cultivar: z.string(),
  origin: z.string(),
  sownOn: z.nullable(z.string()),
  setUpOn: z.nullable(z.string()),
  place: z.string(),
  /** "private", or the club that may see it. */
  seenBy: z.string(),
  /** "new", "none", or the vessel it stands in. */
  standsIn: z.string(),
  vessel: z.object({
    name: z.string(),
    kind: z.enum(VESSEL_KINDS),
    shape: z.enum(VESSEL_SHAPES),
    topLengthCm: measure,
    topWidthCm: measure,
    bottomLengthCm: measure,
    bottomWidthCm: measure,
    heightCm: measure,
    capacityLitres: measure,
    netCupRimCm: measure,
    netCupDepthCm: measure,
    lightProof: z.nullable(z.boolean()),
    plantCount: measure,
  }),
})
export type PlantForm = z.infer<typeof plantFormSchema>

type Issue = { path: string, message: string }

/** Names of the fields by their path in the form; the vessel's carry its name before them. */
export const PLANT_FORM_NAMES: FieldNames = {
  ...PLANT_FIELD_WORDS,
  ...Object.fromEntries(Object.entries(VESSEL_FIELD_WORDS).map(([field, words]) => [`vessel.${field}`, words])),
}

export function emptyPlantForm(today: string): PlantForm {
  return {
    name: '', cropId: null, cultivar: '', origin: '', sownOn: null, setUpOn: today, place: '',
    seenBy: 'private', standsIn: 'new', vessel: { ...emptyVesselFields },
  }
}

export function plantFormOf(plant: PlantFields, vessel: VesselFields | null): PlantForm {
  const { name, cropId, sownOn, setUpOn } = plant
  return {
    name, cropId, sownOn, setUpOn,
    cultivar: plant.cultivar ?? '',
    origin: plant.origin ?? '',
    place: plant.place ?? '',
    seenBy: plant.visibility === 'club' ? plant.clubId ?? 'private' : 'private',
    standsIn: plant.vesselId ?? 'none',
    vessel: vesselFormOf(vessel),
  }
}

/** The part of a vessel's record that the form asks for; its id and owner stay behind. */
export function vesselFormOf(vessel: VesselFields | null): PlantForm['vessel'] {
  return plantFormSchema.shape.vessel.parse(vessel ?? emptyVesselFields)
}

function textOrNull(text: string): string | null {
  return text.trim() === '' ? null : text.trim()
}

/** The part of a plant's record that the form asks for. */
export function plantFieldsOf(form: PlantForm) {
  return {
    name: form.name.trim(),
    cropId: form.cropId,
    cultivar: textOrNull(form.cultivar),
    origin: textOrNull(form.origin),
    sownOn: form.sownOn,
    setUpOn: form.setUpOn ?? '',
    vesselId: form.standsIn === 'new' || form.standsIn === 'none' ? null : form.standsIn,
    place: textOrNull(form.place),
    visibility: form.seenBy === 'private' ? 'private' : 'club',
    clubId: form.seenBy === 'private' ? null : form.seenBy,
  }
}

/** The vessel's record: measures that its shape does not have are left out. */
export function vesselFieldsOf({ vessel }: PlantForm, suggestedName: string): VesselFields {
  const measured = vessel.shape !== 'unmeasured'
  const fourSides = vessel.shape === 'rectangular'
  return {
    ...vessel,
    name: textOrNull(vessel.name) ?? suggestedName,
    topLengthCm: measured ? vessel.topLengthCm : null,
    bottomLengthCm: measured ? vessel.bottomLengthCm : null,
    topWidthCm: fourSides ? vessel.topWidthCm : null,
    bottomWidthCm: fourSides ? vessel.bottomWidthCm : null,
    heightCm: measured ? vessel.heightCm : null,
    capacityLitres: measured ? null : vessel.capacityLitres,
  }
}

export type CheckedPlantForm =
  | { ok: true, plant: PlantFields, vessel: VesselFields | null }
  | { ok: false, issues: Issue[] }

/** Checks the whole form with the schemas of both records. `rest` is what the form does not ask for. */
export function checkPlantForm(
  form: PlantForm, rest: Pick<PlantFields, 'timeZone' | 'endedOn' | 'endReason'>, suggestedName: string, withVessel: boolean,
): CheckedPlantForm {
  const { timeZone, endedOn, endReason } = rest
  const plant = { ...plantFieldsOf(form), timeZone, endedOn, endReason }
  const vessel = withVessel ? vesselFieldsOf(form, suggestedName) : null
  const issues = [...plantIssues(plant), ...(vessel ? vesselIssues(vessel) : [])]
  const parsed = plantFieldsSchema.safeParse(plant)
  return parsed.success && issues.length === 0 ? { ok: true, plant: parsed.data, vessel } : { ok: false, issues }
}

/** What a field without an answer lacks; its schema would speak of a wrong one. */
const MISSING: Record<string, string> = { cropId: 'is missing: choose one', setUpOn: 'is missing' }

function plantIssues(plant: { cropId: unknown, setUpOn: string }): Issue[] {
  const checked = checkWith(plantFieldsSchema, plant)
  const missing = new Set([...(plant.cropId === null ? ['cropId'] : []), ...(plant.setUpOn === '' ? ['setUpOn'] : [])])
  const byPath = new Map<string, Issue>()
  for (const { path, message } of checked.ok ? [] : checked.issues) {
    if (!byPath.has(path)) byPath.set(path, { path, message: missing.has(path) ? MISSING[path] ?? message : message })
  }
  return [...byPath.values()]
}

function vesselIssues(vessel: VesselFields): Issue[] {
  const checked = checkWith(vesselFieldsSchema, vessel)
  const issues = (checked.ok ? [] : checked.issues).map(issue => ({ ...issue, path: `vessel.${issue.path}` }))
  const { heightCm, netCupDepthCm } = vessel
  if (heightCm !== null && netCupDepthCm !== null && netCupDepthCm > heightCm) {
    issues.push({ path: 'vessel.netCupDepthCm', message: 'is more than the height of the vessel' })
  }
  return issues
}

/** The fields whose values differ. */
export function changedFields<T extends object>(before: T, after: T): Partial<T> {
  const changed: Partial<T> = {}
  for (const key in after) if (after[key] !== before[key]) changed[key] = after[key]
  return changed
}

/** "Bucket", or "Bucket 2" where there is one of that name. */
export function freeName(base: string, taken: readonly string[]): string {
  const used = new Set(taken.map(name => name.trim().toLocaleLowerCase()))
  for (let count = 1; ; count += 1) {
    const name = count === 1 ? base : `${base} ${count}`
    if (!used.has(name.toLocaleLowerCase())) return name
  }
}
