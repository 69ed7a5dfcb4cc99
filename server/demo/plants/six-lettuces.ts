import { levelUnder } from '../level'
import { ADA, ODETTE, TIME_ZONE, TOBIAS, WREN } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(15)

/** One filling, never topped up, eaten on day 36. */
export const sixLettuces: DemoPlant = {
  owner: TOBIAS,
  setUpDaysAgo: 40,
  sownDaysBeforeSetUp: 16,
  endedOnDay: 36,
  fields: {
    name: 'Six heads, one filling',
    cropId: 'lettuce',
    cultivar: 'Loose-leaf, green',
    origin: 'Own seed, club swap',
    timeZone: TIME_ZONE,
    place: 'North side, half shade',
    visibility: 'club',
    endReason: 'finished',
  },
  vessel: {
    name: 'Six-hole tote',
    kind: 'tote',
    shape: 'rectangular',
    topLengthCm: 60,
    topWidthCm: 40,
    bottomLengthCm: 54,
    bottomWidthCm: 34,
    heightCm: 20,
    capacityLitres: null,
    netCupRimCm: 5,
    netCupDepthCm: 5,
    lightProof: true,
    plantCount: 6,
  },
  entries: [
    {
      day: 0, time: '10:30',
      fields: {
        ...level(16.5), ph: 5.9, ecMilliSiemensPerCm: 1.4, waterCelsius: 18.5, airCelsius: 20, actions: ['set-up'],
        note: 'Plan: no top-up until harvest. 34 L, cups 1.5 cm in.',
      },
      photos: [{ file: 'lettuce-set-up.jpg', subject: 'set-up' }],
    },
    { day: 2, time: '08:10', fields: { lookedNoChange: true } },
    { day: 4, time: '08:05', fields: { ...level(16), ph: 5.9 } },
    { day: 7, time: '08:20', fields: { ...level(15.5), ph: 6, ecMilliSiemensPerCm: 1.4, waterCelsius: 19 } },
    { day: 9, time: '18:45', fields: { lookedNoChange: true } },
    { day: 11, time: '08:15', fields: { ...level(14.5), ph: 6, note: 'Lid checked with the torch inside: dark.' } },
    {
      day: 14, time: '08:20',
      fields: { ...level(13.5), ph: 6.1, ecMilliSiemensPerCm: 1.4, waterCelsius: 20 },
      photos: [{ file: 'lettuce-roots-14.jpg', subject: 'roots' }],
    },
    { day: 16, time: '08:10', fields: { ...level(13), lookedNoChange: true } },
    { day: 19, time: '08:15', fields: { ...level(12), ph: 6.2 } },
    {
      day: 21, time: '08:20',
      fields: { ...level(11), ph: 6.2, ecMilliSiemensPerCm: 1.4, waterCelsius: 21, note: 'Day 21. No wrigglers.' },
      photos: [{ file: 'lettuce-whole-21.jpg', subject: 'whole' }],
      comments: [
        { by: ADA, text: 'Do you really not top up? I would be nervous by now.', hoursLater: 5 },
        { by: TOBIAS, text: 'Really not. It drinks 0.1 L a head and day, so it lasts to about day 40.', hoursLater: 10 },
      ],
    },
    { day: 23, time: '19:00', fields: { lookedNoChange: true } },
    { day: 25, time: '08:10', fields: { ...level(9.5), ph: 6.3 } },
    {
      day: 28, time: '08:25',
      fields: { ...level(8), ph: 6.4, ecMilliSiemensPerCm: 1.5, waterCelsius: 22, note: 'White and fuzzy above, long below.' },
      photos: [{ file: 'lettuce-roots-28.jpg', subject: 'roots' }],
      comments: [{ by: WREN, text: 'So that is what fuzzy means. Saved this one.', hoursLater: 7 }],
    },
    { day: 30, time: '08:10', fields: { ...level(7.5), lookedNoChange: true } },
    { day: 32, time: '08:15', fields: { ...level(6.5), ph: 6.5, ecMilliSiemensPerCm: 1.6 } },
    {
      day: 34, time: '08:20',
      fields: { ...level(5.5), ph: 6.5, waterCelsius: 23, note: 'Full size. Hot days coming, so I cut in two days, before they get bitter.' },
      photos: [{ file: 'lettuce-whole-34.jpg', subject: 'whole' }],
      comments: [{ by: ODETTE, text: 'Good call. Cut early in the morning, they keep twice as long.', hoursLater: 6 }],
    },
    {
      day: 36, time: '07:15',
      fields: {
        ...level(5), actions: ['harvested'], harvestGrams: 1090, harvestCount: 6,
        note: 'Six heads, roots off, weighed dry. Used 24 L in 36 days. The rest, well thinned, went on the flower boxes; tote scrubbed and upside down.',
      },
      photos: [{ file: 'lettuce-harvest-36.jpg', subject: 'whole' }],
      comments: [
        { by: ODETTE, text: '180 g a head from one filling. May I show this timeline to the new members?', hoursLater: 4 },
        { by: TOBIAS, text: 'Please do.', hoursLater: 5 },
      ],
    },
  ],
}
