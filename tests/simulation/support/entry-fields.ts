/** A visit of a simulated person, now, on which nothing was taken. */
export function entryFields({ plantId, now }: { plantId: string, now: number }): Record<string, unknown> {
  const at = new Date(now).toISOString()
  return {
    plantId, recordedAt: at, occurredAt: at, lookedNoChange: false, note: null, ph: null,
    ecMilliSiemensPerCm: null, waterLevelCm: null, airGapCm: null, waterCelsius: null, airCelsius: null, relativeHumidityPercent: null,
    actions: [], topUpLitres: null, topUpWith: null, changeLitres: null, harvestGrams: null, harvestCount: null,
  }
}
