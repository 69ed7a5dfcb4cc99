import { ellipse, fill, group, makeSheet, rectangle, stroke } from './sheet.mjs'
import { blur, cloud } from './filters.mjs'
import { lighter } from './colour.mjs'
import { finished } from './finish.mjs'
import { LIGHTS } from './backdrop.mjs'
import { cupInLid, floorTiles, VESSEL_TONES } from './vessel.mjs'
import { lettucePlant } from './lettuce.mjs'

/** A lidded tote with holes, seen from above at a slant. `size` 0..1 is how far the heads have grown. */
export function toteScene({ seed, size, leaves, tone = 'cream', light = 'noon', holes = 6, missing = [] }) {
  const sheet = makeSheet(1280, 960)
  const colour = VESSEL_TONES[tone]
  const columns = holes / 2
  const spots = Array.from({ length: holes }, (_, index) => {
    const [column, row] = [index % columns, Math.floor(index / columns)]
    return { index, row, x: 640 + (column - (columns - 1) / 2) * (286 + row * 52), y: 300 + row * 290 }
  })
  const picture = group({},
    floorTiles(sheet, -160, LIGHTS[light].floor),
    group({ filter: blur(sheet, 26) }, rectangle(150, 190, 1110, 760, [0.1, 0.03, 250, 0.5], { rx: 60 })),
    toteLid(sheet, colour),
    spots.map(({ x, y, row, index }) => group({},
      cupInLid(sheet, { x, y, radius: 46 + row * 7, seed: `${seed}${index}` }),
      size > 0 && !missing.includes(index) ? lettucePlant(
        sheet, { seed: `${seed}h${index}`, centre: [x, y - 12 * size], radius: (30 + 122 * size) * (1 + row * 0.13), leaves, squash: 0.8 },
      ) : '')),
  )
  return finished(sheet, picture, { seed: 6, warmth: 0.2, light: [0.1, 0] })
}

function toteLid(sheet, tone) {
  const face = sheet.linear([100, 100], [1180, 860], [[0, lighter(tone, 0.08)], [0.6, tone], [1, lighter(tone, -0.1)]])
  const front = sheet.linear([0, 800], [0, 940], [[0, lighter(tone, -0.1)], [1, lighter(tone, -0.28)]])
  const top = 'M214 96H1066Q1112 96 1118 140L1196 752Q1202 806 1150 806H130Q78 806 84 752L162 140Q168 96 214 96Z'
  return group({},
    fill('M96 770Q92 806 100 840L118 912Q124 936 160 936H1120Q1156 936 1162 912L1180 840Q1188 806 1184 770Z', front),
    fill('M84 752L86 784Q92 836 140 836H1140Q1188 836 1194 784L1196 752Z', lighter(tone, -0.04)),
    fill(top, face),
    fill(top, lighter(tone, -0.1), { filter: cloud(sheet, 0.008, 21, 1.6), opacity: 0.3 }),
    stroke(
      'M228 128H1052Q1084 128 1090 164L1158 724Q1164 766 1124 766H156Q116 766 122 724L190 164Q196 128 228 128Z', lighter(tone, -0.13), 5,
      { opacity: 0.6 },
    ),
    stroke('M230 133H1050Q1078 133 1084 166', lighter(tone, 0.12), 3, { opacity: 0.8 }),
    ellipse(360, 150, 190, 22, [1, 0, 0, 0.4], { filter: blur(sheet, 12) }))
}
