import { levelUnder } from '../level'
import { ADA, MARISOL, ODETTE, TIME_ZONE } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(14.5)

/** Yellow young leaves after a change with harder water, asked about, answered, mended. */
export const doorBasil: DemoPlant = {
  owner: MARISOL,
  setUpDaysAgo: 30,
  sownDaysBeforeSetUp: 24,
  endedOnDay: null,
  fields: {
    name: 'Basil by the door',
    cropId: 'basil',
    cultivar: 'Large-leaved',
    origin: 'Three seedlings in one cup',
    timeZone: TIME_ZONE,
    place: 'Stair door, morning sun',
    visibility: 'club',
    endReason: null,
  },
  vessel: {
    name: 'Cream tub',
    kind: 'tub',
    shape: 'round',
    topLengthCm: 24,
    topWidthCm: null,
    bottomLengthCm: 21,
    bottomWidthCm: null,
    heightCm: 22,
    capacityLitres: null,
    netCupRimCm: 7.6,
    netCupDepthCm: 7.5,
    lightProof: true,
    plantCount: 3,
  },
  entries: [
    {
      day: 0, time: '18:20',
      fields: {
        ...level(15.5), ph: 5.9, ecMilliSiemensPerCm: 1.2, waterCelsius: 22, airCelsius: 24, actions: ['set-up'],
        note: 'Cup 1 cm in the water. Lid has a clip.',
      },
    },
    { day: 1, time: '07:25', fields: { lookedNoChange: true } },
    {
      day: 3, time: '07:40',
      fields: { ...level(15), ph: 5.9, note: 'All three have taken.' },
      photos: [{ file: 'basil-whole-03.jpg', subject: 'whole' }],
    },
    { day: 5, time: '07:30', fields: { ...level(14.5), ph: 5.9 } },
    {
      day: 7, time: '07:35',
      fields: { ...level(14), ph: 6, ecMilliSiemensPerCm: 1.2, waterCelsius: 22.5, note: 'Pinched the tips out.', actions: ['pruned'] },
      photos: [{ file: 'basil-leaf-07.jpg', subject: 'leaf' }],
    },
    { day: 9, time: '07:25', fields: { ...level(13.5), lookedNoChange: true } },
    { day: 11, time: '07:30', fields: { ...level(12.5), ph: 6, ecMilliSiemensPerCm: 1.2 } },
    { day: 14, time: '09:00', fields: { ...level(11), ph: 6.1, ecMilliSiemensPerCm: 1.2, waterCelsius: 23 } },
    {
      day: 14, time: '09:25',
      fields: {
        ...level(12), ph: 6.6, ecMilliSiemensPerCm: 1.4, actions: ['changed-solution'], changeLitres: 4.5,
        note: 'Changed. The kitchen tap was off, so this is water from the courtyard tap.',
      },
    },
    { day: 16, time: '07:20', fields: { ...level(11.5), ph: 7, note: 'pH is climbing. Will look again.' } },
    {
      day: 18, time: '07:30',
      fields: {
        ...level(10.5), ph: 7.3, ecMilliSiemensPerCm: 1.4, waterCelsius: 24, airCelsius: 26,
        note: 'Newest leaves yellow between the veins, veins still green. Old leaves fine. Roots white, no smell. What is it?',
      },
      photos: [
        { file: 'basil-leaf-18.jpg', subject: 'leaf' },
        { file: 'basil-whole-18.jpg', subject: 'whole' },
        { file: 'basil-roots-18.jpg', subject: 'roots' },
      ],
      comments: [
        { by: ODETTE, text: 'Young leaves first, veins green, no spots, pH 7.3: that fits iron the plant cannot reach at this pH. Manganese would show grey specks as well. What was different on day 14?', hoursLater: 2 },
        { by: MARISOL, text: 'The courtyard tap instead of the kitchen one. No specks, I looked with the magnifier.', hoursLater: 4 },
        { by: ODETTE, text: 'Then leave the feed alone and bring the pH down to about 6, over two days. Half the dose first, stir, wait a quarter of an hour, read again. Gloves and goggles, and the acid goes into the water, never the other way round. Judge by the next new leaves: the yellow ones may stay pale.', hoursLater: 5 },
        { by: ADA, text: 'Thank you for the three photos, I had the same in spring and did not know what to look at.', hoursLater: 9 },
      ],
    },
    {
      day: 18, time: '19:15',
      fields: { ph: 6.7, actions: ['swirled'], note: 'Half the dose, gloves and goggles on, stirred with the stick. 7.3 to 6.7.' },
    },
    {
      day: 19, time: '19:10',
      fields: { ...level(10), ph: 6.2, actions: ['swirled'], note: 'It had crept back to 6.9. Second dose: 6.2. Bottle back in the locked box.' },
    },
    { day: 20, time: '07:25', fields: { ...level(9.5), ph: 6.2 } },
    {
      day: 22, time: '07:30',
      fields: {
        ...level(10), ph: 6.1, ecMilliSiemensPerCm: 1.3, actions: ['topped-up'], topUpLitres: 0.5, topUpWith: 'plain-water',
        note: '0.5 L from the kitchen tap. Newest pair looks greener.',
      },
    },
    { day: 24, time: '07:25', fields: { ...level(9), ph: 6.1, lookedNoChange: true } },
    {
      day: 26, time: '07:40',
      fields: { ...level(8), ph: 6.2, ecMilliSiemensPerCm: 1.3, waterCelsius: 24, note: 'New leaves green again, only the edges a little pale.' },
      photos: [{ file: 'basil-leaf-26.jpg', subject: 'leaf' }],
      comments: [
        { by: ODETTE, text: 'That settles it. Write the courtyard tap down with its pH, somebody else will ask.', hoursLater: 3 },
        { by: MARISOL, text: 'Done, it hangs by the tap.', hoursLater: 12 },
      ],
    },
    {
      day: 28, time: '09:10',
      fields: {
        ...level(9), ph: 5.9, ecMilliSiemensPerCm: 1.2, actions: ['changed-solution'], changeLitres: 3.3,
        note: 'Kitchen tap. 7.5 before, 9 now, gap 5.5.',
      },
    },
    {
      day: 29, time: '18:30',
      fields: { ...level(8.5), actions: ['harvested'], harvestGrams: 46, note: 'Cut above the second pair. Left the pale leaves on.' },
      photos: [{ file: 'basil-harvest-29.jpg', subject: 'whole' }],
    },
    { day: 30, time: '07:05', fields: { ...level(8.5), ph: 5.9, lookedNoChange: true } },
  ],
}
