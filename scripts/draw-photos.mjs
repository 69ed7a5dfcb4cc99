/**
 * Draws the demo's photos. For developers only: the pictures are committed, nobody needs this to run the project.
 *
 *   node scripts/draw-photos.mjs                all pictures
 *   node scripts/draw-photos.mjs tomato-roots   those whose name starts so
 *
 * Needs a Chromium; say where it is with STILLROOT_CHROMIUM.
 */
import { mkdir, writeFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import { chromium } from 'playwright-core'
import { pictures } from './draw/pictures.mjs'

/** Tried from the best on until a picture fits. */
const JPEG_QUALITIES = [78, 72, 66, 60, 55]
const BYTES_WANTED = 58_000
const folder = process.env.DEMO_PHOTO_DIR ?? fileURLToPath(new URL('../server/assets/demo/', import.meta.url))
const wanted = process.argv.slice(2)
const chosen = Object.entries(pictures).filter(([name]) => wanted.length === 0 || wanted.some(start => name.startsWith(start)))

async function smallEnough() {
  let bytes
  for (const quality of JPEG_QUALITIES) {
    bytes = await page.screenshot({ type: 'jpeg', quality })
    if (bytes.length <= BYTES_WANTED) break
  }
  return bytes
}

await mkdir(folder, { recursive: true })
const browser = await chromium.launch({
  executablePath: process.env.STILLROOT_CHROMIUM ?? '/usr/bin/chromium',
  args: ['--headless=new', '--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
})
const page = await browser.newPage()
let total = 0
for (const [name, draw] of chosen) {
  const svg = draw()
  const [, width, height] = /width="(\d+)" height="(\d+)"/.exec(svg)
  await page.setViewportSize({ width: Number(width), height: Number(height) })
  await page.setContent(`<style>body{margin:0;overflow:hidden}svg{display:block}</style>${svg}`)
  const bytes = await smallEnough()
  await writeFile(new URL(`${name}.jpg`, `file://${folder}/`), bytes)
  total += bytes.length
  process.stdout.write(`${name} ${Math.round(bytes.length / 1000)} kB\n`)
}
await browser.close()
process.stdout.write(`${chosen.length} pictures, ${Math.round(total / 1000)} kB\n`)
