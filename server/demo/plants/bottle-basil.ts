import { levelUnder } from '../level'
import { ODETTE, TIME_ZONE, TOBIAS } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(19)

/** A clear bottle in a sleeve: the one vessel whose roots show without lifting anything. */
export const bottleBasil: DemoPlant = {
  owner: TOBIAS,
  setUpDaysAgo: 27,
  sownDaysBeforeSetUp: 21,
  endedOnDay: null,
  fields: {
    name: 'Kitchen bottle',
    cropId: 'basil',
    cultivar: 'Large-leaved',
    origin: 'Own seed',
    timeZone: TIME_ZONE,
    place: 'Kitchen step, outside',
    visibility: 'club',
    endReason: null,
  },
  vessel: {
    name: 'Sleeved bottle',
    kind: 'bottle',
    shape: 'round',
    topLengthCm: 15.5,
    topWidthCm: null,
    bottomLengthCm: 15.5,
    bottomWidthCm: null,
    heightCm: 24,
    capacityLitres: null,
    netCupRimCm: 5,
    netCupDepthCm: 5,
    lightProof: true,
    plantCount: 1,
  },
  entries: [
    {
      day: 0, time: '19:30',
      fields: {
        ...level(20), ph: 5.8, ecMilliSiemensPerCm: 1.1, waterCelsius: 21.5, actions: ['set-up', 'covered'],
        note: 'Clear bottle in a sleeve of foil.',
      },
    },
    { day: 2, time: '08:00', fields: { lookedNoChange: true } },
    { day: 3, time: '08:00', fields: { ...level(19.5), ph: 5.8 } },
    { day: 5, time: '08:05', fields: { ...level(19), ph: 5.9, ecMilliSiemensPerCm: 1.1 } },
    {
      day: 8, time: '08:00',
      fields: { ...level(18), ph: 5.9, waterCelsius: 22, note: 'Sleeve down for one minute.' },
      photos: [{ file: 'bottle-basil-roots-08.jpg', subject: 'roots' }],
      comments: [
        { by: ODETTE, text: 'Lovely roots. Sleeve straight back up, light on the water means algae within days.', hoursLater: 3 },
        { by: TOBIAS, text: 'Up again.', hoursLater: 4 },
      ],
    },
    { day: 10, time: '08:05', fields: { ...level(17), ph: 6, lookedNoChange: true } },
    { day: 12, time: '18:40', fields: { ...level(16), actions: ['harvested'], harvestGrams: 18, note: 'Tips only.' } },
    { day: 14, time: '08:10', fields: { ...level(15), ph: 6.1, ecMilliSiemensPerCm: 1.2 } },
    {
      day: 14, time: '08:30',
      fields: { ...level(16), ph: 5.8, ecMilliSiemensPerCm: 1.2, actions: ['changed-solution'], changeLitres: 3, note: 'Changed, 1 cm higher.' },
    },
    { day: 17, time: '08:00', fields: { ...level(14.5), ph: 5.9 } },
    {
      day: 20, time: '08:05',
      fields: { ...level(13.5), ph: 6, ecMilliSiemensPerCm: 1.2, waterCelsius: 23 },
      photos: [{ file: 'bottle-basil-whole-20.jpg', subject: 'whole' }],
    },
    {
      day: 22, time: '08:00',
      fields: { ...level(14), ph: 6, actions: ['topped-up'], topUpLitres: 0.3, topUpWith: 'half-strength', note: '12.5 to 14 cm.' },
    },
    {
      day: 24, time: '18:50',
      fields: { ...level(13), ph: 6.1, actions: ['harvested'], harvestGrams: 41, note: 'Second cut, enough for a jar of sauce.' },
    },
  ],
}
