import type { FieldNames } from './issues'

/** What each field of a record is called on the screen. */
export const PLANT_FIELD_WORDS: FieldNames = {
  name: 'Name',
  cropId: 'Crop',
  cultivar: 'Cultivar',
  origin: 'Came from',
  sownOn: 'Sown on',
  setUpOn: 'Day 0',
  timeZone: 'Time zone',
  vesselId: 'Vessel',
  place: 'Place',
  visibility: 'Who may see it',
  clubId: 'Club',
  endedOn: 'Ended on',
  endReason: 'Reason',
}

export const VESSEL_FIELD_WORDS: FieldNames = {
  name: 'Name of the vessel',
  kind: 'Kind',
  shape: 'Shape',
  topLengthCm: 'Across at the rim',
  topWidthCm: 'Width at the rim',
  bottomLengthCm: 'Across at the floor',
  bottomWidthCm: 'Width at the floor',
  heightCm: 'Height inside',
  capacityLitres: 'Volume by the label',
  netCupRimCm: 'Net cup, across at its rim',
  netCupDepthCm: 'Net cup, depth',
  lightProof: 'Light-proof',
  plantCount: 'Plants in it',
}
