import { levelUnder } from '../level'
import { ADA, BENNO, ODETTE, TIME_ZONE } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(17)

/** A plant that died, and stays in the record. */
export const cornerPepper: DemoPlant = {
  owner: ADA,
  setUpDaysAgo: 31,
  sownDaysBeforeSetUp: 47,
  endedOnDay: 17,
  fields: {
    name: 'Corner pepper',
    cropId: 'pepper',
    cultivar: null,
    origin: 'Nursery, soil washed off',
    timeZone: TIME_ZONE,
    place: 'South-west corner, full sun',
    visibility: 'club',
    endReason: 'died',
  },
  vessel: {
    name: 'Dark bucket',
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
    lightProof: false,
    plantCount: 1,
  },
  entries: [
    {
      day: 0, time: '17:10',
      fields: {
        ...level(18), ph: 6, ecMilliSiemensPerCm: 1.6, waterCelsius: 23, actions: ['set-up'],
        note: 'Washed the soil off as well as I could.',
      },
    },
    { day: 2, time: '18:00', fields: { note: 'Droops. Said to be normal for a plant out of soil.' } },
    { day: 4, time: '18:10', fields: { ...level(17.5), ph: 6.1 } },
    { day: 7, time: '17:50', fields: { ...level(17), ph: 6.2, waterCelsius: 26 } },
    { day: 9, time: '18:00', fields: { ...level(16.5), lookedNoChange: true } },
    {
      day: 12, time: '18:20',
      fields: {
        ...level(16), ph: 6.3, ecMilliSiemensPerCm: 1.7, waterCelsius: 29, airCelsius: 34,
        note: 'Water is warm to the hand. Green film under the lid, it lets light in on one side.',
      },
    },
    {
      day: 14, time: '18:15',
      fields: {
        ...level(15.5), waterCelsius: 30, airCelsius: 35, actions: ['moved'],
        note: 'Hangs all day now, even in the morning. Moved it into the shade.',
      },
      photos: [{ file: 'lost-pepper-whole-14.jpg', subject: 'whole' }],
      comments: [{ by: ODETTE, text: 'Shade is right. Can you look at the roots, and smell them?', hoursLater: 1 }],
    },
    {
      day: 16, time: '08:10',
      fields: { ...level(15.5), ph: 5.4, waterCelsius: 28, note: 'Brown and slimy, smells of the drain. The skin slips off.' },
      photos: [{ file: 'lost-pepper-roots-16.jpg', subject: 'roots' }],
      comments: [
        { by: ODETTE, text: 'I am sorry. Slime, smell and skin that slips together point to root rot, and 30 °C water is how it starts. I would not try to save it next to healthy buckets.', hoursLater: 2 },
      ],
    },
    {
      day: 17, time: '18:30',
      fields: {
        note: 'Ended it. What I would change: pale bucket, tight lid, shade from noon. Bucket scrubbed, then disinfected and rinsed, gloves on, nothing else mixed in.',
      },
      comments: [
        { by: BENNO, text: 'Thank you for writing it up. There is a pale tub in the store, take it.', hoursLater: 2 },
        { by: ODETTE, text: 'Records like this one save other plants.', hoursLater: 14 },
      ],
    },
  ],
}
