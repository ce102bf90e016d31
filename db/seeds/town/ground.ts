/** Land, water and green of the invented island, drawn by hand as a few points and smoothed. */
import { seededRandom } from '../seeded-random'
import { curveThrough, ribbon } from './line'
import { distance, type Line, path, type Point, towards } from './plane'
import { middleOf, type Ring } from './ring'

export type GreenKind = 'park' | 'wood' | 'pitch' | 'allotment' | 'marsh' | 'beach' | 'field'
export type Green = { readonly kind: GreenKind; readonly name: string | null; readonly ring: Ring }
export type Ground = {
  readonly land: readonly Ring[]
  readonly water: readonly Ring[]
  readonly piers: readonly Ring[]
  readonly greens: readonly Green[]
}

/** The main island clockwise from the west lip of the river's mouth. */
const LARROW: Line = path(
  `40,-770 -110,-735 -300,-765 -450,-850 -560,-1010 -700,-1090 -850,-1050 -920,-900 -1080,-800 -1330,-830 -1600,-790 -1820,-640 -2060,-420 -2130,-120 -2090,180 -2330,430 -2420,720 -2270,960 -2380,1260 -2210,1640 -1870,1800 -1640,2110 -1180,2230 -760,2110 -330,2260 120,2330 560,2180 960,2240 1420,2090 1750,1820 2190,1700 2420,1330 2760,1090 2890,700 2700,370 2790,20 2560,-300 2230,-470 1980,-640 1640,-640 1330,-760 1000,-800 760,-790 560,-830 400,-810 330,-770`,
)

const LLINOS: Line = path(
  `-5350,2350 -5180,2640 -4860,2830 -4520,2790 -4230,2900 -3920,2720 -3760,2420 -3850,2130 -4080,2010 -4230,2090 -4340,1960 -4560,1780 -4900,1800 -5190,1990`,
)

const SKERRIES: readonly Line[] = [
  `-1330,-1180 -1250,-1130 -1170,-1170 -1210,-1240`,
  `-1060,-1330 -1010,-1290 -950,-1330 -1000,-1370`,
  `3240,950 3310,1040 3400,1010 3370,900`,
].map(path)

export const RIVER: Line = curveThrough(
  path(
    `-1620,1720 -1380,1560 -1220,1330 -960,1260 -760,1090 -560,1010 -430,800 -210,660 -120,470 20,300 -20,90 60,-110 50,-330 120,-520 180,-690 185,-840`,
  ),
  5,
)

/** 5 m at the spring, 28 m at the old bridge, an estuary of 290 m at the mouth. */
const riverWidth = (share: number) => 5 + 26 * share + 260 * Math.max(0, (share - 0.8) / 0.2) ** 2

/** A hand-drawn outline gets the crinkles of a shore. */
function shore(points: Line, seed: string, roughness: number): Point[] {
  const random = seededRandom(seed)
  const middle = middleOf(points)
  let swell = 0
  return curveThrough(points, 7, true).map((point) => {
    const out = distance(middle, point)
    swell = swell * 0.7 + random.between(-1, 1) * roughness
    return towards(middle, Math.atan2(point[1] - middle[1], point[0] - middle[0]), out + swell)
  })
}

const rounded = (points: Line) => curveThrough(points, 4, true)
const green = (kind: GreenKind, name: string | null, points: string, sharp = false): Green => ({
  kind,
  name,
  ring: sharp ? path(points) : rounded(path(points)),
})
const strand = (name: string | null, points: string, least: number, more: number): Green => ({
  kind: 'beach',
  name,
  ring: ribbon(curveThrough(path(points), 4), (share) => least + more * Math.sin(Math.PI * share)),
})

const GREENS: readonly Green[] = [
  green('field', null, `-2050,900 -1500,950 -1450,1350 -1750,1550 -2100,1400`),
  green('field', null, `1500,1150 2300,1000 2350,1350 1900,1650 1450,1500`),
  green('field', null, `-700,1500 0,1480 60,1950 -640,1900`),
  green('field', null, `350,1560 1000,1500 1200,1850 500,2000`),
  green('field', null, `2080,100 2550,150 2600,700 2150,760`),
  green('wood', 'Hagg Wood', `-2180,330 -1880,250 -1700,420 -1760,690 -2020,790 -2260,690`),
  green('wood', 'Riverside Hanger', `-1500,1300 -1280,1130 -1030,1120 -1060,1230 -1270,1290 -1420,1500`),
  green('wood', null, `1080,1250 1330,1230 1420,1420 1240,1560 1060,1440`),
  green('wood', 'Gallows Plantation', `-150,1900 250,1850 420,2050 120,2180 -130,2080`),
  green('park', 'Beacon Point', `-860,-980 -700,-1040 -590,-970 -520,-830 -580,-700 -760,-740 -870,-850`),
  green('park', 'Aldermen’s Park', `-640,-250 -560,-400 -540,-560 -640,-640 -760,-560 -770,-330`),
  green('park', 'Riverside Meadow', `-330,690 -190,600 -150,420 -250,330 -330,470`),
  green('park', 'Wharf Gardens', `95,-190 140,-160 118,-20 130,90 110,120 60,110 70,-20`),
  green('park', 'Bailey Green', `-545,-200 -480,-205 -478,-330 -520,-380`),
  green('field', null, `-1150,1500 -800,1420 -760,1800 -1120,1820`),
  green('field', null, `-1960,-20 -1800,40 -1640,160 -1650,320 -1900,200`),
  green('pitch', 'Recreation Ground', `1010,300 1200,330 1190,480 1000,470`, true),
  green('pitch', null, `-1560,190 -1420,160 -1390,270 -1530,300`, true),
  green('allotment', 'Loomside Allotments', `-1180,650 -1050,610 -910,775 -1030,870`, true),
  green('allotment', 'Dock Allotments', `1060,-560 1240,-590 1260,-480 1080,-450`, true),
  green('marsh', 'Sallow Marsh', `1700,-480 2000,-500 2200,-340 2380,-200 2300,-60 2080,-120 1860,-300`),
  strand('Long Strand', `1010,-785 1330,-742 1640,-622 1980,-622 2220,-455 2540,-292`, 16, 52),
  strand(null, `-1090,-795 -1330,-818 -1600,-778 -1810,-632`, 10, 42),
  green('field', null, `-5150,2300 -4780,2260 -4720,2620 -5050,2600`),
  green('wood', 'Coed Llinos', `-4420,2480 -4100,2500 -4000,2640 -4220,2740 -4450,2680`),
  strand(null, `-4090,2025 -4225,2095 -4330,1975`, 26, 0),
]

const PIERS: readonly Ring[] = [
  ribbon(curveThrough(path(`-70,-720 -60,-860 20,-980 140,-1030`), 5), () => 15),
  ribbon(curveThrough(path(`520,-790 530,-940 450,-1060 340,-1110`), 5), () => 15),
  ribbon(path(`-4250,2080 -4200,1960 -4110,1920`), () => 10),
]

/** The dock beside the new quay, a mill pond, and a reservoir on the hill. */
const POOLS: readonly Ring[] = [
  path(`330,-700 345,-545 585,-570 575,-635 455,-625 448,-700`),
  rounded(path(`-640,1150 -560,1120 -520,1180 -570,1260 -660,1240`)),
  rounded(path(`1560,830 1690,790 1800,880 1760,990 1610,970`)),
  rounded(path(`-640,-470 -610,-540 -660,-560 -690,-490`)),
]

/** The island as it lies in the sea. */
export const ground = (): Ground => ({
  land: [
    shore(LARROW, 'larrow shore', 9),
    shore(LLINOS, 'llinos shore', 8),
    ...SKERRIES.map((points, at) => shore(points, `skerry ${at}`, 4)),
  ],
  water: [ribbon(RIVER, riverWidth), ...POOLS],
  piers: PIERS,
  greens: GREENS,
})
