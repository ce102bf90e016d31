/** The estate, the closes, the quay, and the village across the water. */
import { type District } from './district'
import { path } from './plane'

export const NEWER_DISTRICTS: readonly District[] = [
  {
    name: 'Netherfold',
    label: [690, 900],
    era: 'postwar',
    frontage: 'estate',
    ring: path(
      '235,392 420,452 640,482 860,532 1010,572 1250,612 1432,762 1468,935 1220,1032 960,1082 620,1082 300,1032 68,995 72,765 168,560',
    ),
    layout: {
      by: 'closes',
      streets: [
        ['Sorrel Way', '205,470 400,560 640,596 880,650 1085,745 1180,880 1150,1052'],
        ['Yarrow Road', '100,660 320,757 560,822 800,865 955,935 990,1084'],
        ['Bracken Road', '430,452 402,560 362,670 320,757 300,890 290,1034'],
        ['Campion Road', '650,484 640,596 592,720 560,822 596,950 622,1086'],
        ['Tansy Road', '885,540 880,650 842,760 800,865'],
        ['Burnet Road', '1085,745 1010,830 955,935'],
        ['Betony Way', '1262,622 1200,700 1085,745'],
        ['Samphire Road', '1442,800 1300,840 1180,880'],
      ],
      step: 70,
      reach: [50, 96],
      room: 34,
      names: 'netherfold',
    },
  },
  {
    name: 'Curlew Rise',
    label: [1420, -160],
    era: 'eighties',
    frontage: 'detached',
    ring: path(
      '1052,2 1280,60 1620,120 1858,64 1855,-60 1785,-245 1655,-398 1480,-428 1230,-388 1055,-408 1050,-180',
    ),
    layout: {
      by: 'closes',
      streets: [
        ['Curlew Rise', '1280,70 1300,-40 1400,-110 1540,-120 1680,-190 1760,-300'],
        ['Tern Drive', '1300,-40 1190,-130 1160,-270 1230,-400'],
        ['Fulmar Drive', '1400,-110 1390,-220 1450,-330 1480,-440'],
        ['Petrel Drive', '1540,-120 1600,-10 1620,130'],
      ],
      step: 58,
      reach: [58, 120],
      room: 31,
      names: 'curlew',
    },
  },
  {
    name: 'Carrside',
    label: [1600, 540],
    era: 'eighties',
    frontage: 'detached',
    ring: path('1302,215 1610,298 1930,475 1945,690 1760,750 1560,740 1470,720 1275,595 1318,420'),
    layout: {
      by: 'closes',
      streets: [
        ['Carr Lane', '1312,420 1450,400 1600,450 1740,560 1880,600'],
        ['Reedbed Drive', '1600,450 1540,560 1460,640 1350,668'],
      ],
      step: 58,
      reach: [56, 110],
      room: 31,
      names: 'carrside',
    },
  },
  {
    name: 'Millrace',
    label: [-190, 1200],
    era: 'millennium',
    frontage: 'semi',
    ring: path('-460,972 -380,980 -180,970 14,998 52,1240 36,1430 -250,1410 -470,1260 -490,1090'),
    layout: {
      by: 'closes',
      streets: [
        ['Miller Way', '-300,955 -290,1060 -220,1160 -230,1290 -150,1380 38,1400'],
        ['Tenterfield Road', '-220,1160 -110,1180 52,1200'],
      ],
      step: 58,
      reach: [54, 105],
      room: 30,
      names: 'millrace',
    },
  },
  {
    name: 'Northgate',
    label: [40, 620],
    era: 'sixties',
    frontage: 'semi',
    ring: path('222,385 155,560 56,760 14,972 -180,942 -330,942 -270,790 -140,660 -70,480 60,330 225,300'),
    layout: {
      by: 'closes',
      streets: [['Weir Road', '155,560 60,520 -10,600 -60,720 -150,800 -180,950']],
      step: 60,
      reach: [50, 100],
      room: 31,
      names: 'northgate',
    },
  },
  {
    name: 'Ropewalk Quay',
    label: [760, -660],
    era: 'quay',
    frontage: 'none',
    ring: path(
      '345,-520 590,-545 700,-560 860,-540 990,-470 1035,-430 1030,-600 960,-740 760,-765 560,-800 460,-780 460,-640 590,-640 590,-575',
    ),
    layout: {
      by: 'hand',
      streets: [
        ['Ropewalk', '700,-560 692,-655 610,-670 520,-700 490,-770', 'none'],
        ['Fathom Way', '692,-655 820,-690 930,-640 985,-555 990,-470', 'none'],
        ['Tarpaulin Street', '860,-540 840,-620 820,-690', 'none', 'lane'],
      ],
    },
  },
  {
    name: 'Aberllinos',
    label: [-4330, 2330],
    era: 'victorian',
    frontage: 'cottage',
    ring: path('-4900,1830 -4700,2640 -4000,2600 -3850,2150 -4230,2120 -4480,1850'),
    layout: {
      by: 'hand',
      streets: [
        ['Heol y Cei', '-4520,1880 -4400,2020 -4270,2130 -4130,2110 -3960,2150 -3860,2260', 'cottage'],
        ['Stryd yr Eglwys', '-4270,2130 -4290,2270 -4360,2390 -4520,2430 -4700,2400', 'cottage'],
        ['Lôn Fain', '-4400,2020 -4440,2150 -4410,2270 -4290,2270', 'cottage', 'lane'],
        ['Lôn y Felin', '-4440,2150 -4580,2180 -4700,2140 -4900,2180', 'cottage', 'lane'],
        ['Heol Bryn Golau', '-4290,2270 -4150,2290 -4050,2250 -3960,2150', 'cottage'],
        ['Lôn Goed', '-4360,2390 -4330,2520 -4480,2620 -4700,2680', 'none', 'lane'],
      ],
    },
  },
]
