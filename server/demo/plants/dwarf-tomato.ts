import { levelUnder } from '../level'
import { BENNO, MARISOL, ODETTE, TIME_ZONE, WREN } from '../people'
import type { DemoPlant } from '../types'
import { tomatoFirstMonth } from './dwarf-tomato-first-month'

const level = levelUnder(23.5)

/** The main story: seven weeks from a plant in bud to the first bowl of tomatoes. */
export const dwarfTomato: DemoPlant = {
  owner: MARISOL,
  setUpDaysAgo: 48,
  sownDaysBeforeSetUp: 44,
  endedOnDay: null,
  fields: {
    name: 'Button',
    cropId: 'tomato',
    cultivar: 'Dwarf cherry, red',
    origin: 'Own seed, raised on the kitchen sill',
    timeZone: TIME_ZONE,
    place: 'South parapet, sun from ten',
    visibility: 'club',
    endReason: null,
  },
  vessel: {
    name: 'Slate bucket',
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
    ...tomatoFirstMonth,
    {
      day: 30, time: '07:25',
      fields: {
        ...level(15), ph: 6, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength',
        note: 'Was down to 13.5. Not back up to the old mark, the fuzzy roots stay in air.',
      },
    },
    {
      day: 32, time: '07:10',
      fields: {
        ...level(14.5), ph: 6.1, ecMilliSiemensPerCm: 2.2, waterCelsius: 24.5, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength',
      },
    },
    {
      day: 33, time: '08:45',
      fields: {
        ...level(14.5), ecMilliSiemensPerCm: 2, actions: ['rained-in'],
        note: 'Rain in the night came in by the string hole. About 1 cm more than it should be. Hole taped.',
      },
      comments: [{ by: BENNO, text: 'Same at two other buckets. I will bring more tape up tomorrow.', hoursLater: 3 }],
    },
    {
      day: 35, time: '07:15',
      fields: {
        ...level(12), ph: 6.2, ecMilliSiemensPerCm: 2.1, waterCelsius: 25, airCelsius: 27,
        note: 'Day 35. Thick and cream-coloured now. Smells of nothing.',
      },
      photos: [{ file: 'tomato-roots-35.jpg', subject: 'roots' }],
    },
    {
      day: 35, time: '07:30',
      fields: { ...level(14), actions: ['topped-up'], topUpLitres: 1.1, topUpWith: 'half-strength', note: '12 to 14 cm, no further.' },
    },
    {
      day: 37, time: '07:20',
      fields: {
        ...level(13.5), ph: 6.2, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'plain-water',
        note: 'Hot. Plain water this time, the strength was creeping up.',
      },
    },
    { day: 38, time: '18:30', fields: { lookedNoChange: true, note: 'My neighbour looked in while I was away. All well.' }, typedHoursLater: 26 },
    {
      day: 39, time: '07:35',
      fields: {
        ...level(13), ph: 6.3, ecMilliSiemensPerCm: 2.2, waterCelsius: 26, actions: ['topped-up', 'pruned'], topUpLitres: 0.9,
        topUpWith: 'half-strength',
        note: 'Took off three old leaves at the bottom.',
      },
    },
    { day: 40, time: '07:10', fields: { lookedNoChange: true } },
    { day: 41, time: '07:20', fields: { ...level(11), ph: 6.4, ecMilliSiemensPerCm: 2.3, waterCelsius: 26 } },
    {
      day: 42, time: '08:00',
      fields: { ...level(10.5), ph: 6.5, ecMilliSiemensPerCm: 2.4, note: 'First colour on the lower truss, 34 days after that flower opened.' },
      photos: [{ file: 'tomato-fruit-42.jpg', subject: 'fruit' }],
      comments: [{ by: WREN, text: 'They look painted. Mine has only just set its first flower.', hoursLater: 4 }],
    },
    {
      day: 42, time: '08:40',
      fields: {
        ...level(12.5), ph: 5.9, ecMilliSiemensPerCm: 2.4, waterCelsius: 23.5, actions: ['changed-solution'], changeLitres: 6.9,
        note: 'Third change. 2 cm up, gap 11. Old solution in the labelled can, thinned for the flower boxes over the week.',
      },
      comments: [
        { by: ODETTE, text: 'Well kept. From now on the fruit drinks for you, so look at the level every second day at least.', hoursLater: 6 },
      ],
    },
    {
      day: 44, time: '07:15',
      fields: {
        ...level(12), ph: 6, ecMilliSiemensPerCm: 2.4, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'plain-water',
        note: 'Old leaves at the bottom a bit yellow. Only those, so I leave it.',
      },
      photos: [{ file: 'tomato-whole-44.jpg', subject: 'whole' }],
    },
    {
      day: 46, time: '07:20',
      fields: {
        ...level(11.5), ph: 6.1, ecMilliSiemensPerCm: 2.3, waterCelsius: 25, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength',
      },
    },
    {
      day: 47, time: '18:50',
      fields: {
        ...level(11), actions: ['harvested'], harvestGrams: 212, harvestCount: 18,
        note: 'First bowl. Thin skin, sweet. Hands and scissors washed first.',
      },
      photos: [{ file: 'tomato-harvest-47.jpg', subject: 'fruit' }],
      comments: [{ by: BENNO, text: 'Put me down for four on club evening.', hoursLater: 2 }],
    },
    {
      day: 48, time: '06:50',
      fields: {
        ...level(10.5), waterCelsius: 22.5, airCelsius: 21, relativeHumidityPercent: 64,
        note: 'Stands well after the picking. Water this evening.',
      },
    },
  ],
}
