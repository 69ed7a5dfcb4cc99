import { levelUnder } from '../level'
import { MARISOL, ODETTE, TIME_ZONE, WREN } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(23.5)

/** A first season: tan roots in a hot week, and how to tell stain from rot. */
export const stairAubergine: DemoPlant = {
  owner: WREN,
  setUpDaysAgo: 35,
  sownDaysBeforeSetUp: 52,
  endedOnDay: null,
  fields: {
    name: 'Plum',
    cropId: 'aubergine',
    cultivar: 'Small, dark',
    origin: 'Seedling from the club table',
    timeZone: TIME_ZONE,
    place: 'Top of the stairs',
    visibility: 'club',
    endReason: null,
  },
  vessel: {
    name: 'Blue bucket',
    kind: 'bucket',
    shape: 'round',
    topLengthCm: 29,
    topWidthCm: null,
    bottomLengthCm: 26,
    bottomWidthCm: null,
    heightCm: 35.5,
    capacityLitres: null,
    netCupRimCm: 15,
    netCupDepthCm: 12,
    lightProof: true,
    plantCount: 1,
  },
  entries: [
    {
      day: 0, time: '18:00',
      fields: {
        ...level(25), ph: 6, ecMilliSiemensPerCm: 1.8, waterCelsius: 21, airCelsius: 23, actions: ['set-up'],
        note: 'My first one. Benno helped me with the lid.',
      },
    },
    { day: 1, time: '18:10', fields: { lookedNoChange: true } },
    { day: 3, time: '18:20', fields: { ...level(24.5), ph: 6 } },
    { day: 6, time: '09:30', fields: { ...level(24), ph: 6.1, ecMilliSiemensPerCm: 1.8 } },
    { day: 8, time: '18:15', fields: { ...level(23.5), note: 'The water no longer touches the cup. Left it, as Odette said.' } },
    { day: 10, time: '09:20', fields: { ...level(22.5), ph: 6.2, waterCelsius: 22, note: 'Four new leaves this week.' } },
    { day: 12, time: '18:20', fields: { ...level(21.5), lookedNoChange: true } },
    {
      day: 14, time: '09:40',
      fields: { ...level(20), ph: 6.4, ecMilliSiemensPerCm: 1.7, waterCelsius: 23 },
      photos: [{ file: 'aubergine-roots-14.jpg', subject: 'roots' }],
    },
    {
      day: 14, time: '10:20',
      fields: {
        ...level(20.5), ph: 6, ecMilliSiemensPerCm: 2.3, actions: ['changed-solution'], changeLitres: 11.6,
        note: 'Changed for the first time. Took me 40 minutes.',
      },
      comments: [{ by: ODETTE, text: 'The next one takes fifteen. Level and gap noted before and after, exactly right.', hoursLater: 5 }],
    },
    { day: 17, time: '18:20', fields: { ...level(18.5), ph: 6.1, waterCelsius: 25, airCelsius: 31 } },
    {
      day: 19, time: '18:30',
      fields: { ...level(17), ph: 6.1, ecMilliSiemensPerCm: 2.4, waterCelsius: 27, airCelsius: 34, note: 'Very hot. Leaves hang from noon to five.' },
    },
    {
      day: 22, time: '08:00',
      fields: { ...level(15.5), ph: 6.2, ecMilliSiemensPerCm: 2.5, waterCelsius: 27.5, airCelsius: 29, note: 'The roots have gone tan. Is it rot?' },
      photos: [{ file: 'aubergine-roots-22.jpg', subject: 'roots' }],
      comments: [
        { by: ODETTE, text: 'Three things to try before we call it rot: do they smell, are they slimy, does the skin slip off when you pull one gently?', hoursLater: 1 },
        { by: WREN, text: 'No smell. Firm. Nothing slips off.', hoursLater: 3 },
        { by: ODETTE, text: 'Then I would think of stain or age from warm water rather than rot. I cannot be sure from a photo. Get the water below 25: shade the bucket, pale cloth round it. Same photo in a week, new white tips would be the good sign.', hoursLater: 4 },
        { by: MARISOL, text: 'I have a white sheet over, take it from the railing.', hoursLater: 6 },
      ],
    },
    {
      day: 22, time: '18:40',
      fields: {
        ...level(17), actions: ['topped-up', 'covered', 'moved'], topUpLitres: 0.9, topUpWith: 'plain-water',
        note: 'Sheet round it, moved behind the chimney. 0.9 L of cool water, 1.5 cm.',
      },
    },
    { day: 24, time: '18:20', fields: { ...level(15.5), ph: 6.2, ecMilliSiemensPerCm: 2.3, waterCelsius: 24.5 } },
    {
      day: 26, time: '09:15',
      fields: {
        ...level(16), ph: 6.3, waterCelsius: 24, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength',
        note: 'First flower open!',
      },
      photos: [{ file: 'aubergine-flower-26.jpg', subject: 'fruit' }],
      comments: [{ by: MARISOL, text: 'Beautiful. Shake the stem a little around noon.', hoursLater: 2 }],
    },
    {
      day: 28, time: '09:30',
      fields: {
        ...level(16), ph: 6, ecMilliSiemensPerCm: 2.4, waterCelsius: 23, actions: ['changed-solution'], changeLitres: 8.9,
        note: 'Twenty minutes this time. 14.5 before, 16 after.',
      },
    },
    {
      day: 30, time: '19:40',
      fields: { ...level(14.5), ph: 6.1, waterCelsius: 24, note: 'A fruit, as long as my thumb.' },
      photos: [{ file: 'aubergine-whole-30.jpg', subject: 'whole' }],
    },
    {
      day: 31, time: '08:30',
      fields: { ...level(14), ph: 6.1, ecMilliSiemensPerCm: 2.4, waterCelsius: 23.5, note: 'White tips on nearly all of them.' },
      photos: [{ file: 'aubergine-roots-31.jpg', subject: 'roots' }],
      comments: [{ by: ODETTE, text: 'That is the answer. The old tan stays, the new growth counts. Well looked after.', hoursLater: 2 }],
    },
    {
      day: 33, time: '18:30',
      fields: { ...level(14), ph: 6.2, waterCelsius: 24, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength', note: '12.5 to 14.' },
    },
  ],
}
