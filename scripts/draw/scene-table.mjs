import { ellipse, fill, group, makeSheet, rectangle, stroke } from './sheet.mjs'
import { blur, cloud } from './filters.mjs'
import { lighter } from './colour.mjs'
import { away, curve } from './geometry.mjs'
import { finished } from './finish.mjs'
import { makeRandom } from './random.mjs'
import { LIGHTS, softTerrace } from './backdrop.mjs'
import { bucket, floorTiles, VESSEL_TONES } from './vessel.mjs'
import { bowl, jug, looseLid, spoon, standingCup, table } from './props.mjs'
import { tomatoFruit } from './fruit-and-flower.mjs'
import { smallLeaf, stem } from './small-leaf.mjs'
import { lettucePlant } from './lettuce.mjs'
import { written } from './handwriting.mjs'
import { droplets } from './inside-vessel.mjs'

/** Day 0: everything laid out before the plant goes in. */
export function setUpScene({ seed, tone = 'slate', light = 'morning' }) {
  const sheet = makeSheet(1280, 960)
  const picture = group({},
    softTerrace(sheet, { seed, light, horizon: 0.3, floorAt: 0.5 }),
    floorTiles(sheet, 452, LIGHTS[light].floor),
    looseLid(sheet, { x: 850, y: 640, radius: 196, squash: 0.36, turn: -4, tone: VESSEL_TONES[tone] }),
    bucket(sheet, { x: 390, y: 296, top: 205, bottom: 178, height: 420, tone: VESSEL_TONES[tone], lid: false }),
    standingCup(sheet, { x: 700, y: 690, top: 92, bottom: 64, height: 112 }),
    jug(sheet, { x: 1040, y: 560, width: 190, height: 270 }),
    spoon(sheet, { x: 300, y: 850, length: 330, turn: -6 }),
  )
  return finished(sheet, picture, { seed: 3, warmth: 0.24, light: [0.1, 0] })
}

/** A strip of paper tape on the vessel's wall with two handwritten lines. */
export function labelScene({ seed, lines, tone = 'slate', ink = [0.28, 0.05, 260], turn = -4 }) {
  const sheet = makeSheet(1280, 960)
  const colour = VESSEL_TONES[tone]
  const round = sheet.linear([0, 0], [1280, 0], [[0, lighter(colour, -0.14)], [0.3, lighter(colour, 0.1)], [0.65, colour], [1, lighter(colour, -0.2)]])
  const paper = sheet.linear([250, 300], [1040, 700], [[0, [0.95, 0.03, 90]], [1, [0.86, 0.04, 82]]])
  const ragged = makeRandom(seed, 'tape')
  const edge = side => Array.from(
    { length: 16 },
    (_, index) => `L${side > 0 ? 1050 + ragged.around(0, 7) : 235 + ragged.around(0, 7)} ${side > 0 ? 290 + index * 25 : 665 - index * 25}`,
  ).join('')
  const tape = `M235 290L1050 290${edge(1)}L235 665${edge(-1)}Z`
  const picture = group({},
    rectangle(-20, -20, 1320, 1000, round),
    rectangle(-20, -20, 1320, 1000, lighter(colour, 0.16), { filter: cloud(sheet, '0.004 0.02', 11, 1.8), opacity: 0.25 }),
    [
      86, 118,
    ].map(y => stroke(`M-20 ${y}Q640 ${y + 70} 1300 ${y}`, lighter(colour, -0.14), 10) + stroke(
      `M-20 ${y + 9}Q640 ${y + 79} 1300 ${y + 9}`, lighter(colour, 0.14), 4,
    )),
    droplets({ middle: 640, topHalf: 660 }, { seed, fromY: 150, toY: 940, count: 120 }),
    group({ transform: `rotate(${turn} 640 480)` },
      group({ filter: blur(sheet, 9) }, fill(tape, [0.1, 0.03, 220, 0.5], { transform: 'translate(8 14)' })),
      fill(tape, paper),
      fill(tape, [0.7, 0.05, 80], { filter: cloud(sheet, '0.09 0.012', 16, 2.4), opacity: 0.28 }),
      lines.map((line, index) => written(
        line, { x: 420 + index * 30, y: 474 + index * 128, size: index === 0 ? 74 : 58, colour: ink, seed: `${seed}${index}` },
      )),
      fill('M235 290L480 290L400 665L235 665Z', [1, 0.01, 90, 0.16])),
  )
  return finished(sheet, picture, { seed: 5, warmth: 0.18, light: [0.1, 0.05] })
}

/** A bowl of tomatoes on the terrace table. */
export function tomatoHarvest({ seed, count }) {
  const sheet = makeSheet(1280, 960)
  const random = makeRandom(seed, 'bowl')
  const [behind, before] = bowl(sheet, { x: 640, y: 520, radius: 400 })
  const fruits = Array.from({ length: count }, (_, index) => {
    const [turn, out] = [index * 2.4, Math.sqrt((index + 0.5) / count)]
    return [
      640 + Math.cos(turn) * out * 296, 506 + Math.sin(turn) * out * 92 - (1 - out) * 46, random.between(62, 84),
      random.chance(0.16) ? random.between(0.55, 0.8) : random.between(0.88, 1),
    ]
  }).sort((a, b) => a[1] - b[1])
  const picture = group({},
    table(sheet, { seed }), behind,
    fruits.map(([x, y, radius, ripe], index) => group(
      {}, ellipse(x + 8, y + radius * 0.7, radius, radius * 0.5, [0.1, 0.05, 30, 0.4], { filter: blur(sheet, 10) }),
      tomatoFruit(sheet, { at: [x, y], radius, ripe, seed: `${seed}${index}`, calyxAngle: -Math.PI / 2 + random.around(0, 0.9) }),
    )),
    before, ellipse(1150, 852, 76, 24, [0.1, 0.04, 40, 0.55], { filter: blur(sheet, 9) }), tomatoFruit(
      sheet, { at: [1120, 800], radius: 70, ripe: 1, seed: 'loose', calyxAngle: -2.2 },
    ),
  )
  return finished(sheet, picture, { seed: 8, warmth: 0.26, light: [0.1, 0] })
}

/** Cut basil stems laid on the table. */
export function basilHarvest({ seed, stems = 7 }) {
  const sheet = makeSheet(1280, 960)
  const random = makeRandom(seed, 'bunch')
  const tie = [910, 500]
  const sprigs = Array.from({ length: stems }, (_, index) => {
    const spread = (index - (stems - 1) / 2) / stems
    const angle = Math.PI - spread * 1.15 + random.around(0, 0.05)
    const foot = [1130 + random.around(0, 40), tie[1] - spread * 190]
    const length = random.between(500, 590)
    const line = curve(foot, [tie[0] + 90, tie[1] - spread * 30], away(tie, angle, length * 0.35), away(tie, angle, length), 22)
    const leaves = [0.58, 0.72, 0.86, 0.98].flatMap((share, pair) => [-1, 1].map(side => smallLeaf({
      kind: 'basil', seed: `${seed}${index}${pair}${side}`, from: line[Math.round(share * 22)], angle: angle + side * (1.25 - pair * 0.24) + random.around(
        0, 0.16,
      ),
      length: 190 - pair * 24 + random.around(0, 22), droop: 0.1, tilt: side * 0.1, colour: [0.55 + share * 0.07, 0.15, 133], gloss: 0.9,
    })))
    return { order: Math.abs(spread), art: group({}, stem(line, 12, 7, [0.62, 0.1, 128]), leaves) }
  }).sort((a, b) => b.order - a.order).map(sprig => sprig.art)
  const shade = ellipse(520, 540, 360, 270, [0.12, 0.04, 90, 0.5], { filter: blur(sheet, 34) })
  const knot = [
    -8, 6, 19,
  ].map(dx => stroke(`M${tie[0] + 20 + dx} ${tie[1] - 46}q14 46 2 94`, [0.8, 0.06, 78], 11) + stroke(
    `M${tie[0] + 17 + dx} ${tie[1] - 44}q14 46 2 90`, [0.93, 0.035, 85, 0.8], 3.5,
  ))
  const picture = group({}, table(sheet, { seed, tone: [0.72, 0.045, 70] }), shade, sprigs, knot,
    stroke(`M${tie[0] + 34} ${tie[1] + 44}q30 70 -10 110M${tie[0] + 36} ${tie[1] + 44}q70 40 60 96`, [0.84, 0.05, 80], 8))
  return finished(sheet, picture, { seed: 9, warmth: 0.22, light: [0.1, 0] })
}

/** Lettuce heads on a cloth. */
export function lettuceHarvest({ seed }) {
  const sheet = makeSheet(1280, 960)
  const cloth = 'M120 150Q640 90 1160 150Q1210 480 1170 850Q640 910 110 850Q70 480 120 150Z'
  const heads = [[360, 330, 205], [890, 300, 215], [610, 480, 222], [330, 640, 214], [930, 640, 226], [630, 760, 190]]
  const stripes = [
    0.14, 0.2, 0.8, 0.86,
  ].map(share => stroke(`M${110 + 1060 * share} 130Q${110 + 1060 * share + 14} 480 ${110 + 1060 * share} 880`, [0.55, 0.09, 240, 0.5], 13))
  const picture = group({}, table(sheet, { seed, tone: [0.58, 0.06, 58] }),
    group({ filter: blur(sheet, 14) }, fill(cloth, [0.1, 0.03, 50, 0.5], { transform: 'translate(12 22)' })),
    fill(cloth, [0.95, 0.012, 90]), fill(
      cloth, [0.7, 0.02, 250], { filter: cloud(sheet, '0.008 0.006', 31, 2.2), opacity: 0.25 },
    ), group({ 'clip-path': sheet.clip(fill(cloth, '#fff')) }, stripes),
    heads.map(([x, y, radius], index) => lettucePlant(
      sheet,
      {
        seed: `${seed}${index}`, centre: [x, y], radius, leaves: 19, squash: 0.82,
        colour: index % 3 === 1 ? [0.66, 0.15, 130] : [0.71, 0.155, 124],
      },
    )))
  return finished(sheet, picture, { seed: 2, warmth: 0.22, light: [0.15, 0] })
}
