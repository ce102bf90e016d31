/** The roads that districts lie between, drawn by hand, and the railway. */
import { curveThrough } from './line'
import { type Line, path } from './plane'

export type RoadClass = 'main' | 'street' | 'lane' | 'close' | 'walk'
export type MainRoad = {
  readonly name: string
  readonly class: RoadClass
  readonly line: Line
  readonly bridge?: true
}

const road = (name: string, points: string, kind: RoadClass = 'main'): MainRoad => ({
  name,
  class: kind,
  line: curveThrough(path(points), 5),
})

export const MAIN_ROADS: readonly MainRoad[] = [
  road('Staithe Street', `-560,-170 -420,-190 -260,-225 -110,-235 60,-235`),
  road('Bridge Road', `60,-235 190,-225 320,-190`),
  road('Dockgate', `320,-190 330,-330 310,-460 345,-520`),
  road('Quay Road', `345,-520 590,-545 700,-560 860,-540 990,-470 1040,-420`),
  road('Eastern Road', `320,-190 520,-130 760,-70 1010,0 1280,70 1620,130 1980,30 2330,-60 2560,30`),
  road('Strand Road', `1040,-420 1230,-400 1480,-440 1660,-410 1800,-250 1870,-60 1870,75`),
  road('Station Road', `320,-190 300,-40 260,110 240,210`),
  road('Northgate', `240,210 230,380 160,560 60,760 20,980 60,1240 40,1450`),
  road('Gallows Road', `40,1450 50,1600 110,1760 260,2010 700,2080`, 'lane'),
  road('Moor Road', `230,380 420,440 640,470 860,520 1010,560 1260,600 1440,760 1480,1010`),
  road('Moor Lane', `1480,1010 1430,1240 1620,1560 1880,1640 2150,1480 2420,1180 2500,860`, 'lane'),
  road('Fold Road', `60,1000 300,1040 620,1090 960,1090 1220,1040 1450,950`),
  road('Carrside', `1260,600 1310,420 1290,240 1280,70`),
  road('Westgate', `-560,-170 -780,-130 -980,-60 -1180,-70`),
  road('Loom Road', `-560,-170 -540,10 -470,170 -400,320 -420,540 -540,720 -640,880`),
  road('Mill Road', `-640,880 -560,930 -380,960 -180,950 20,980`),
  road('Hill Road', `-1180,-70 -1190,170 -1130,400 -1010,570 -820,760 -640,880`),
  road('Hagg Road', `-1190,170 -1400,340 -1590,560 -1660,800 -1820,1020 -1860,1330 -1980,1500`),
  road(
    'Shore Road',
    `-300,-680 -440,-660 -560,-680 -800,-690 -1000,-650 -1240,-690 -1520,-660 -1720,-510 -1830,-300 -1790,-60 -1620,100 -1400,130 -1190,170`,
  ),
  road('Cliff Lane', `-1860,1330 -1640,1640 -1300,1900 -860,1880 -420,1960 110,1760`, 'lane'),
  road('Hagg Lane', `-1590,560 -1820,600 -2060,540 -2200,300`, 'lane'),
  road('Watermeadow Lane', `-640,880 -800,960 -1060,1040 -1310,1060 -1500,1180 -1860,1330`, 'lane'),
  road('Warren Lane', `620,1090 640,1300 560,1520 700,1800 700,2080`, 'lane'),
  road('East Field Lane', `1980,30 2060,220 2040,420 2120,640 2260,800 2500,860`, 'lane'),
  road('Wharf Road', `190,-225 150,-120 140,20 170,120 240,150`, 'street'),
  road('Castlegate', `-420,-190 -460,-330 -470,-480 -440,-660`, 'street'),
  road('Low Quay', `60,-235 10,-330 10,-450 -40,-580 -160,-655 -300,-680`, 'street'),
  road('Beacon Walk', `-560,-680 -620,-780 -690,-880 -720,-1000`, 'walk'),
  road('Park Walk', `-560,-280 -620,-390 -600,-500 -660,-610 -650,-680`, 'walk'),
  road('Strand Walk', `1040,-420 1060,-600 1200,-690 1520,-610 1800,-560 2120,-440 2380,-250`, 'walk'),
  road('Meadow Walk', `-400,320 -280,400 -240,540 -320,700 -380,960`, 'walk'),
]

export const RAILWAY: Line = curveThrough(
  path(
    `-330,130 -180,145 20,165 250,205 470,240 720,255 960,235 1290,190 1620,270 2000,480 2370,520 2680,480`,
  ),
  5,
)
export const DOCK_LINE: Line = curveThrough(
  path(`900,242 990,170 1030,20 1020,-180 960,-360 840,-480 700,-520 610,-515`),
  5,
)
/** The end of the line, beside the old town. */
export const STATION: Line = path(`-300,134 -180,146`)
