import { levelUnder } from '../level'
import { MARISOL, ODETTE, TOBIAS, WREN } from '../people'
import type { DemoEntry } from '../types'

const level = levelUnder(23.5)

/** From set-up to the second change. */
export const tomatoFirstMonth: DemoEntry[] = [
  {
    day: 0, time: '17:40',
    fields: {
      ...level(25), ph: 6, ecMilliSiemensPerCm: 1.6, waterCelsius: 20.5, airCelsius: 23, actions: ['set-up'],
      note: '14.4 L mixed with a level spoon I weighed first. Lower 1.5 cm of the cup stands in it. First buds showing already. Lid on, child-proof strap on.',
    },
    photos: [
      { file: 'tomato-set-up.jpg', subject: 'set-up' }, { file: 'tomato-label.jpg', subject: 'label' },
      { file: 'tomato-whole-00.jpg', subject: 'whole' }, { file: 'tomato-roots-00.jpg', subject: 'roots' },
    ],
    comments: [
      { by: ODETTE, text: 'A good start, and a photo of the label. Same spot and same hour for the next ones and you can lay them side by side.', hoursLater: 3 },
    ],
  },
  { day: 1, time: '07:20', fields: { lookedNoChange: true } },
  { day: 2, time: '07:15', fields: { ...level(25), ph: 6, waterCelsius: 20, note: 'Hung its leaves at noon, up again by evening.' } },
  { day: 4, time: '07:30', fields: { ...level(24.5), ph: 6.1, ecMilliSiemensPerCm: 1.6 } },
  { day: 5, time: '19:05', fields: { lookedNoChange: true } },
  {
    day: 7, time: '07:25',
    fields: {
      ...level(24), ph: 6.1, ecMilliSiemensPerCm: 1.6, waterCelsius: 21, airCelsius: 22,
      note: 'Day 7. Roots out of the cup all round, the longest about 9 cm.',
    },
    photos: [{ file: 'tomato-roots-07.jpg', subject: 'roots' }],
  },
  {
    day: 8, time: '18:40',
    fields: { note: 'First truss open. Tapped it with a pencil.' },
    photos: [{ file: 'tomato-flower-08.jpg', subject: 'fruit' }],
  },
  {
    day: 9, time: '07:20',
    fields: { ...level(23.5), note: 'The water has just let go of the cup.' },
    comments: [
      { by: WREN, text: 'Is that bad? I would have filled it up.', hoursLater: 2 },
      { by: ODETTE, text: 'It is the plan. The roots left in the air learn to breathe there. From now on raise it by 2 cm at most, and never back to the cup.', hoursLater: 5 },
    ],
  },
  { day: 10, time: '07:30', fields: { ...level(23), ph: 6.2, ecMilliSiemensPerCm: 1.6 }, photos: [{ file: 'tomato-leaf-10.jpg', subject: 'leaf' }] },
  { day: 12, time: '07:15', fields: { ...level(22), lookedNoChange: true } },
  {
    day: 14, time: '08:10',
    fields: {
      ...level(20.5), ph: 6.4, ecMilliSiemensPerCm: 1.5, waterCelsius: 22, airCelsius: 24,
      note: 'Day 14. First fuzz on the roots above the water.',
    },
    photos: [{ file: 'tomato-roots-14.jpg', subject: 'roots' }, { file: 'tomato-whole-14.jpg', subject: 'whole' }],
  },
  {
    day: 14, time: '08:45',
    fields: {
      ...level(21), ph: 6, ecMilliSiemensPerCm: 2, waterCelsius: 21, actions: ['changed-solution'], changeLitres: 11.9,
      note: 'First change, stronger for flowering. Left a gap of 2.5 cm.',
    },
    comments: [
      { by: ODETTE, text: 'That white fuzz is what you want: roots that breathe, not mould. Mould would lie on the clay too.', hoursLater: 4 },
    ],
  },
  { day: 16, time: '07:20', fields: { ...level(19.5), ph: 6, ecMilliSiemensPerCm: 2 } },
  {
    day: 18, time: '07:25',
    fields: { ...level(18), ph: 6.1, ecMilliSiemensPerCm: 2, waterCelsius: 23, note: 'Drinks about half a litre a day now.' },
  },
  { day: 19, time: '19:10', fields: { lookedNoChange: true } },
  {
    day: 20, time: '07:15',
    fields: { ...level(18), ph: 6.1, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength', note: '16.5 to 18 cm.' },
  },
  {
    day: 21, time: '07:30',
    fields: {
      ...level(17.5), ph: 6.2, ecMilliSiemensPerCm: 1.9, waterCelsius: 23.5,
      note: 'Day 21. Looked for mosquitoes with the torch: no wrigglers, mesh is whole.',
    },
    photos: [{ file: 'tomato-roots-21.jpg', subject: 'roots' }],
    comments: [
      { by: TOBIAS, text: 'What mesh do you use under the lid?', hoursLater: 8 },
      { by: MARISOL, text: 'Window screen, a ring of it round the cup. Checked every week, it takes ten seconds.', hoursLater: 11 },
    ],
  },
  { day: 23, time: '07:20', fields: { ...level(17), ph: 6.2, actions: ['topped-up'], topUpLitres: 0.9, topUpWith: 'half-strength' } },
  { day: 25, time: '19:00', fields: { lookedNoChange: true } },
  { day: 26, time: '07:20', fields: { ...level(14.5), ph: 6.4, ecMilliSiemensPerCm: 1.9, waterCelsius: 24, airCelsius: 27 } },
  {
    day: 26, time: '07:35',
    fields: { ...level(16.5), actions: ['topped-up'], topUpLitres: 1.1, topUpWith: 'half-strength', note: 'Up to the tape mark, 2 cm.' },
  },
  {
    day: 28, time: '08:05',
    fields: {
      ...level(14.5), ph: 6.5, ecMilliSiemensPerCm: 1.9, waterCelsius: 24,
      note: 'Day 28. Roots lie on the floor of the bucket. Green fruit the size of a pea.',
    },
    photos: [{ file: 'tomato-roots-28.jpg', subject: 'roots' }, { file: 'tomato-whole-28.jpg', subject: 'whole' }],
  },
  {
    day: 28, time: '08:50',
    fields: {
      ...level(16), ph: 5.9, ecMilliSiemensPerCm: 2.3, waterCelsius: 22.5, actions: ['changed-solution'], changeLitres: 8.9,
      note: 'Second change, 1.5 cm higher than before and no more. Kept the roots wet in a bowl meanwhile.',
    },
  },
]
