/** Level and air gap as one tape measure gives them: both from the same net cup. */
export function levelUnder(cupBottomCm: number): (waterLevelCm: number) => { waterLevelCm: number, airGapCm: number } {
  return waterLevelCm => ({ waterLevelCm, airGapCm: Math.max(0, cupBottomCm - waterLevelCm) })
}
