import * as z from 'zod/mini'
import { CROP_IDS } from '../science/crops/crop-ids'
import { calendarDaySchema, idSchema, NAME_MAX, optionalText, requiredText, SHORT_TEXT_MAX, timeZoneSchema } from './primitives'

/** Who may see a plant and all its entries. */
export const VISIBILITIES = ['private', 'club'] as const
export type Visibility = (typeof VISIBILITIES)[number]

/** Why a plant was ended. */
export const END_REASONS = ['finished', 'died', 'gave-up', 'accident'] as const
export type EndReason = (typeof END_REASONS)[number]

/** Every field of a plant that its owner may change. */
export const plantFieldsSchema = z.strictObject({
  name: requiredText(NAME_MAX),
  cropId: z.enum(CROP_IDS, 'is not a crop on the list'),
  cultivar: optionalText(SHORT_TEXT_MAX),
  /** Where it came from: a nursery, a cutting from a friend, own seed. */
  origin: optionalText(SHORT_TEXT_MAX),
  sownOn: z.nullable(calendarDaySchema),
  /** Day 0: the day the plant was set up in its vessel. */
  setUpOn: calendarDaySchema,
  /** The plant's own zone; day numbers are counted in it. */
  timeZone: timeZoneSchema,
  vesselId: z.nullable(idSchema),
  place: optionalText(SHORT_TEXT_MAX),
  visibility: z.enum(VISIBILITIES),
  /** The club that may see it when visibility is "club". */
  clubId: z.nullable(idSchema),
  endedOn: z.nullable(calendarDaySchema),
  endReason: z.nullable(z.enum(END_REASONS)),
})
export type PlantFields = z.infer<typeof plantFieldsSchema>

export const plantPatchSchema = z.partial(plantFieldsSchema)

/** A plant as everybody allowed to see it gets it. */
export type Plant = PlantFields & { id: string, ownerId: string }
