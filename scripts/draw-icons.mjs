// Draws the PNG icons from public/icons/stillroot.svg with a Chromium on this
// machine. Run it after the drawing changed; its outputs are committed.
//   CHROME_PATH=/usr/bin/chromium node scripts/draw-icons.mjs
import { readFile, writeFile } from 'node:fs/promises'
import { chromium } from 'playwright-core'

const folder = new URL('../public/icons/', import.meta.url)
const GROUND = '#fbf8f1'
// A maskable icon may lose everything outside the middle circle of 80 %; the drawing keeps within it.
const icons = [
  { file: 'stillroot-180.png', side: 180, share: 1, square: true },
  { file: 'stillroot-192.png', side: 192, share: 1, square: false },
  { file: 'stillroot-512.png', side: 512, share: 1, square: false },
  { file: 'stillroot-maskable-512.png', side: 512, share: 0.8, square: true },
]

const drawing = await readFile(new URL('stillroot.svg', folder), 'utf8')
const browser = await chromium.launch({
  executablePath: process.env.CHROME_PATH ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--no-first-run', '--disable-background-networking'],
})
for (const { file, side, share, square } of icons) {
  const page = await browser.newPage({ viewport: { width: side, height: side } })
  await page.setContent(`<style>
    html, body { margin: 0; background: ${square ? GROUND : 'transparent'} }
    svg { display: block; width: ${side * share}px; margin: ${side * (1 - share) / 2}px }
  </style>${drawing}`)
  await writeFile(new URL(file, folder), await page.screenshot({ omitBackground: true }))
  await page.close()
}
await browser.close()
