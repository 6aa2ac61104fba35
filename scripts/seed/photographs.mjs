/** Drawn stand-ins for a job's photographs: plain scenes with their claim written on them, so that nobody takes one for a real picture. */
import { randomUUID } from 'node:crypto'
import sharp from 'sharp'

const WIDTH = 1200
const HEIGHT = 900

const box = (x, y, width, height, fill, label = '', size = 34) =>
  `<rect x="${x}" y="${y}" width="${width}" height="${height}" rx="10" fill="${fill}" stroke="#3b3b3b" stroke-width="4"/>${label && `<text x="${x + width / 2}" y="${y + height / 2 + size / 3}" font-size="${size}" text-anchor="middle" fill="#1d1d1d">${label}</text>`}`
const line = (points, colour, width = 14) => `<polyline points="${points}" fill="none" stroke="${colour}" stroke-width="${width}" stroke-linejoin="round"/>`

const CUTOUT = box(420, 420, 300, 300, '#4a4a4a') + box(470, 520, 200, 120, '#d8d4c8', '80 A')
const METER = box(440, 120, 280, 220, '#e8e8e2', '048 217')
const BOARD = box(250, 220, 700, 380, '#f2f1ec') + Array.from({ length: 9 }, (_, at) => box(290 + at * 70, 320, 56, 160, at === 8 ? '#c8ddcf' : '#ffffff', at === 8 ? '9' : `${at + 1}`, 28)).join('')
const CHARGER = box(460, 220, 280, 400, '#33413b') + box(520, 290, 160, 60, '#9fd3b4', 'Ready', 28)
const BRICKS = Array.from({ length: 9 }, (_, row) => line(`0,${row * 90} ${WIDTH},${row * 90}`, '#b9978a', 3)).join('')

/** What stands in the middle of each picture. */
const SCENES = {
  'intake': METER + CUTOUT + line('570,340 570,420', '#777') + line('720,560 900,560 900,760', '#2f8f4e'),
  'cutout-rating': box(300, 180, 600, 520, '#4a4a4a') + box(380, 320, 440, 220, '#d8d4c8', 'Main fuse carrier · 80 A', 38),
  'meter': box(320, 180, 560, 460, '#e8e8e2', '048 217 kWh', 60),
  'earthing-terminal': box(400, 360, 400, 120, '#c9a24a', 'Main earthing terminal') + line('460,480 460,760', '#2f8f4e') + line('740,480 740,760', '#2f8f4e'),
  'bonding': box(250, 340, 700, 90, '#c77f4f') + box(540, 300, 130, 170, '#bdbdbd', 'Clamp', 30),
  'board-closed': BOARD,
  'board-finished': BOARD + line('850,480 850,700 1000,700', '#555', 20),
  'circuit-label': box(300, 180, 600, 520, '#ffffff') + '<text x="600" y="330" font-size="44" text-anchor="middle">Circuit chart</text><text x="600" y="480" font-size="40" text-anchor="middle">9 · Charging point · 40 A</text>',
  'surge-device': box(440, 240, 320, 420, '#ffffff', 'Surge device') + box(560, 300, 80, 60, '#4caf6a'),
  'route': BRICKS + line('80,300 700,300 700,640 1120,640', '#2d2d2d', 20),
  'position': BRICKS + '<rect x="460" y="240" width="280" height="400" fill="none" stroke="#1d4ed8" stroke-width="6" stroke-dasharray="24 16"/>',
  'parking': box(120, 520, 960, 240, '#9a9a9a') + box(330, 420, 520, 190, '#6d86a8', 'Vehicle'),
  'charger-fitted': BRICKS + CHARGER + line('600,620 600,760', '#2d2d2d', 20),
  'charger-serial': box(260, 280, 680, 320, '#d9d9d9', 'Rating plate · 7.4 kW · 32 A', 44),
  'earth-connection': box(420, 300, 360, 240, '#ececec', 'Terminal') + line('600,540 600,780', '#2f8f4e', 22),
  'isolator': BRICKS + box(480, 300, 240, 320, '#f0f0f0', 'Isolator'),
  'open-pen-device': box(300, 300, 600, 280, '#e6e6e6', 'Open-PEN device · IET 01', 42),
  'electrode': box(420, 520, 360, 120, '#6f7f5f', 'Inspection pit') + line('600,120 600,560', '#b87333', 18),
  'ct-direction': box(440, 300, 320, 260, '#2f2f2f') + '<text x="600" y="450" font-size="64" text-anchor="middle" fill="#ffffff">→ load</text>',
  'limit-setting': box(360, 200, 480, 460, '#101820') + '<text x="600" y="460" font-size="96" text-anchor="middle" fill="#9fd3b4">60 A</text>',
  'reading-sheet': box(320, 80, 560, 660, '#fffdf5') + Array.from({ length: 9 }, (_, row) => line(`370,${170 + row * 60} 830,${170 + row * 60}`, '#b9b9b9', 3)).join(''),
}

const picture = (claim, label) => `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" font-family="sans-serif"><rect width="100%" height="100%" fill="#cfcabf"/>${SCENES[claim]}<rect y="${HEIGHT - 90}" width="100%" height="90" fill="#1d1d1d"/><text x="40" y="${HEIGHT - 34}" font-size="38" fill="#ffffff">Drawn for the demo · ${label}</text></svg>`

/** Keeps each drawing's bytes once, and notes it on as many jobs as want it. */
export function demoPhotographs({ services, firm }, send) {
  const kept = new Map()
  async function draw(claim) {
    const drawn = await sharp(Buffer.from(picture(claim, services.findShot(claim).label))).jpeg({ quality: 80 }).toBuffer()
    return (await services.keepFile(firm.id, drawn)).sha256
  }
  function bytesOf(claim) {
    if (!kept.has(claim)) kept.set(claim, draw(claim))
    return kept.get(claim)
  }
  return async (who, job, claims, at) => {
    for (const claim of claims) await send(who, job, 'keep-photograph', { id: randomUUID(), claim, sha256: await bytesOf(claim), takenAt: at }, { at })
  }
}

export const SURVEY_SHOTS = ['intake', 'cutout-rating', 'earthing-terminal', 'board-closed', 'position']
export const WORK_SHOTS = ['board-finished', 'circuit-label', 'surge-device', 'route', 'charger-fitted', 'charger-serial', 'earth-connection', 'isolator', 'open-pen-device']
export const LIMITER_SHOTS = ['ct-direction', 'limit-setting']
