import type { VesselFields } from '#shared/domain/vessel.schema'
import type { CutMeasures } from '~/utils/waterline/vessel-cut'

/** The measures a vessel is drawn with; those nobody took are left to the picture's own. */
export function cutMeasuresOf(vessel: VesselFields | null): Partial<CutMeasures> {
  if (!vessel) return {}
  const { topLengthCm, bottomLengthCm, heightCm, netCupRimCm, netCupDepthCm } = vessel
  const measured = {
    topCm: topLengthCm, bottomCm: bottomLengthCm, heightCm, cupRimCm: netCupRimCm,
    cupDepthCm: netCupDepthCm !== null && heightCm !== null && netCupDepthCm > heightCm ? null : netCupDepthCm,
  }
  return Object.fromEntries(Object.entries(measured).filter(([, value]) => value !== null))
}
