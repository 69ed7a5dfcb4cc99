import { levelUnder } from '../level'
import { MARISOL, TIME_ZONE } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(17)

/** Kept to herself: a trial nobody needs to see before it works. */
export const balconyPepper: DemoPlant = {
  owner: MARISOL,
  setUpDaysAgo: 24,
  sownDaysBeforeSetUp: 50,
  endedOnDay: null,
  fields: {
    name: 'Rain-water trial',
    cropId: 'pepper',
    cultivar: 'Sweet, pointed',
    origin: 'Swapped for basil seedlings',
    timeZone: TIME_ZONE,
    place: 'Own balcony, east side',
    visibility: 'private',
    endReason: null,
  },
  vessel: {
    name: 'Clay-coloured bucket',
    kind: 'bucket',
    shape: 'round',
    topLengthCm: 26.5,
    topWidthCm: null,
    bottomLengthCm: 22,
    bottomWidthCm: null,
    heightCm: 28,
    capacityLitres: null,
    netCupRimCm: 15,
    netCupDepthCm: 11,
    lightProof: true,
    plantCount: 1,
  },
  entries: [
    {
      day: 0, time: '11:10',
      fields: {
        ...level(18), ph: 5.8, ecMilliSiemensPerCm: 1.3, waterCelsius: 19.5, actions: ['set-up'],
        note: 'Rain water only, to see how far the pH drifts without the tap. Not sharing this one yet.',
      },
    },
    { day: 3, time: '07:45', fields: { ...level(17.5), ph: 5.7 } },
    { day: 6, time: '07:40', fields: { ...level(17), ph: 5.6, ecMilliSiemensPerCm: 1.3 } },
    { day: 7, time: '19:20', fields: { lookedNoChange: true } },
    { day: 9, time: '07:40', fields: { ...level(16.5), ph: 5.6, waterCelsius: 21 } },
    { day: 12, time: '07:45', fields: { ...level(15.5), ph: 5.5, ecMilliSiemensPerCm: 1.2 } },
    {
      day: 14, time: '08:50',
      fields: {
        ...level(15.5), ph: 5.8, ecMilliSiemensPerCm: 1.5, actions: ['changed-solution'], changeLitres: 6.8,
        note: 'Was at 15. Nothing in rain water holds the pH, it fell by 0.3 in two weeks.',
      },
    },
    {
      day: 16, time: '08:00',
      fields: { ...level(14.5), ph: 5.7, note: 'First flower.' },
      photos: [{ file: 'pepper-whole-16.jpg', subject: 'whole' }],
    },
    { day: 18, time: '19:00', fields: { lookedNoChange: true } },
    { day: 20, time: '07:40', fields: { ...level(12.5), ph: 5.6, ecMilliSiemensPerCm: 1.5, waterCelsius: 22.5 } },
  ],
}
