// Draws the icons under public/icons and app/ from the mark in app/icon.svg: `node scripts/draw-icons.mjs`, after the
// mark has changed. Colours are the day theme's: an icon file cannot know the reader's.
import { readFileSync, writeFileSync } from 'node:fs'
import { chromium } from '@playwright/test'

const GROUND = '#f4f6f5'
/** Parts of an icon's width the mark fills: whole, inside a round corner, inside the safe circle of a maskable icon. */
const WHOLE = 1
const INSET = 0.74
const SAFE = 0.56

const ICONS = [
  { file: 'public/icons/mark-192.png', size: 192, part: WHOLE, ground: 'transparent' },
  { file: 'public/icons/mark-512.png', size: 512, part: WHOLE, ground: 'transparent' },
  { file: 'public/icons/mark-maskable-512.png', size: 512, part: SAFE, ground: GROUND },
  { file: 'app/apple-icon.png', size: 180, part: INSET, ground: GROUND },
]
const FAVICON = { file: 'app/favicon.ico', size: 32, part: WHOLE, ground: 'transparent' }

// The dark scheme's colours go: they depend on who looks.
const mark = readFileSync('app/icon.svg', 'utf8').replace(/\s*@media[^{]*\{(?:[^{}]*\{[^{}]*\})*\s*\}/, '')
writeFileSync('public/icons/mark.svg', mark)

const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox', '--disable-gpu'] })
try {
  const page = await browser.newPage()
  for (const icon of ICONS) writeFileSync(icon.file, await draw(page, icon))
  writeFileSync(FAVICON.file, asIco(await draw(page, FAVICON), FAVICON.size))
} finally {
  await browser.close()
}

async function draw(page, { size, part, ground }) {
  await page.setViewportSize({ width: size, height: size })
  const side = Math.round(size * part)
  await page.setContent(
    `<body style="margin:0;height:100vh;display:grid;place-items:center;background:${ground}">
      <div style="width:${side}px;height:${side}px;display:grid">${mark}</div></body>`,
  )
  return page.screenshot({ omitBackground: true })
}

/** One PNG in an ICO file: six bytes of header, sixteen of directory, the picture. */
function asIco(png, size) {
  const head = Buffer.alloc(22)
  head.writeUInt16LE(1, 2)
  head.writeUInt16LE(1, 4)
  head.writeUInt8(size, 6)
  head.writeUInt8(size, 7)
  head.writeUInt16LE(1, 10)
  head.writeUInt16LE(32, 12)
  head.writeUInt32LE(png.length, 14)
  head.writeUInt32LE(head.length, 18)
  return Buffer.concat([head, png])
}
