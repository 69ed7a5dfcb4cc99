import * as z from 'zod/mini'
import { NAME_MAX, optionalCount, optionalNumber, requiredText } from './primitives'

/** What the vessel is called in the trade. */
export const VESSEL_KINDS = ['bucket', 'tub', 'tote', 'bottle', 'other'] as const
export type VesselKind = (typeof VESSEL_KINDS)[number]

/** How its volume follows from its measures. */
export const VESSEL_SHAPES = ['round', 'rectangular', 'unmeasured'] as const
export type VesselShape = (typeof VESSEL_SHAPES)[number]

/** Largest inner side, diameter or height that is believed, cm. */
export const VESSEL_SIDE_MAX_CM = 500
/** Largest volume that is believed, L. */
export const VESSEL_LITRES_MAX = 5_000
/** Most plants in one vessel. */
export const VESSEL_PLANTS_MAX = 200

const side = optionalNumber(0.1, VESSEL_SIDE_MAX_CM)

/** Every field of a vessel that a person may change. Measures are inside measures. */
export const vesselFieldsSchema = z.strictObject({
  name: requiredText(NAME_MAX),
  kind: z.enum(VESSEL_KINDS),
  shape: z.enum(VESSEL_SHAPES),
  /** Diameter of a round vessel, or length of a rectangular one, at the rim. */
  topLengthCm: side,
  /** Width of a rectangular vessel at the rim; null for a round one. */
  topWidthCm: side,
  /** Diameter or length at the floor. */
  bottomLengthCm: side,
  /** Width of a rectangular vessel at the floor; null for a round one. */
  bottomWidthCm: side,
  heightCm: side,
  /** Brim volume as the maker gives it, for a vessel nobody measured. */
  capacityLitres: optionalNumber(0.05, VESSEL_LITRES_MAX),
  netCupRimCm: optionalNumber(0.5, 100),
  netCupDepthCm: optionalNumber(0.5, 100),
  /** True when no light reaches the solution; null when nobody looked. */
  lightProof: z.nullable(z.boolean()),
  plantCount: optionalCount(1, VESSEL_PLANTS_MAX),
})
export type VesselFields = z.infer<typeof vesselFieldsSchema>

export const vesselPatchSchema = z.partial(vesselFieldsSchema)

/** A vessel as everybody allowed to see it gets it. */
export type Vessel = VesselFields & { id: string, ownerId: string }

export const emptyVesselFields: VesselFields = {
  name: '',
  kind: 'bucket',
  shape: 'unmeasured',
  topLengthCm: null,
  topWidthCm: null,
  bottomLengthCm: null,
  bottomWidthCm: null,
  heightCm: null,
  capacityLitres: null,
  netCupRimCm: null,
  netCupDepthCm: null,
  lightProof: null,
  plantCount: 1,
}
