import { levelUnder } from '../level'
import { ADA, TIME_ZONE, TOBIAS } from '../people'
import type { DemoPlant } from '../types'

const level = levelUnder(13)

/** Ada's new start, in a tub nobody has measured yet. */
export const secondLettuce: DemoPlant = {
  owner: ADA,
  setUpDaysAgo: 9,
  sownDaysBeforeSetUp: 18,
  endedOnDay: null,
  fields: {
    name: 'Second try',
    cropId: 'lettuce',
    cultivar: 'Loose-leaf, green',
    origin: 'Seedlings from Tobias',
    timeZone: TIME_ZONE,
    place: 'North side, half shade',
    visibility: 'club',
    endReason: null,
  },
  vessel: {
    name: 'Pale tub from the store',
    kind: 'tub',
    shape: 'unmeasured',
    topLengthCm: null,
    topWidthCm: null,
    bottomLengthCm: null,
    bottomWidthCm: null,
    heightCm: null,
    capacityLitres: 10,
    netCupRimCm: 5,
    netCupDepthCm: 5,
    lightProof: true,
    plantCount: 2,
  },
  entries: [
    {
      day: 0, time: '18:15',
      fields: {
        ...level(14), ph: 5.9, ecMilliSiemensPerCm: 1.3, waterCelsius: 20, actions: ['set-up'],
        note: 'Pale tub, tight lid, shade. Two seedlings.',
      },
      photos: [{ file: 'second-lettuce-label.jpg', subject: 'label' }],
      comments: [{ by: TOBIAS, text: 'They were the two strongest of the tray. Good luck!', hoursLater: 2 }],
    },
    { day: 1, time: '18:20', fields: { lookedNoChange: true } },
    { day: 3, time: '18:10', fields: { ...level(14), ph: 5.9, waterCelsius: 21 } },
    { day: 5, time: '18:15', fields: { lookedNoChange: true } },
    {
      day: 7, time: '18:05',
      fields: { ...level(13.5), ph: 6, ecMilliSiemensPerCm: 1.3, waterCelsius: 21, note: 'Roots are white. Lid is dark inside, checked twice.' },
    },
    { day: 9, time: '07:40', fields: { ...level(13), waterCelsius: 20, lookedNoChange: true } },
  ],
}
