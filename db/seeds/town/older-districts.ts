/** Old town, terraces, and the suburbs up to the sixties. */
import { type District } from './district'
import { path } from './plane'

export const OLDER_DISTRICTS: readonly District[] = [
  {
    name: 'Old Staithe',
    label: [-200, -410],
    era: 'medieval',
    frontage: 'old',
    ring: path(
      '-560,-170 -540,10 -470,120 20,120 60,-235 10,-450 -40,-580 -160,-655 -300,-680 -440,-660 -470,-480',
    ),
    layout: {
      by: 'hand',
      streets: [
        ['Friar Row', '-260,-225 -272,-330 -250,-450 -300,-560 -292,-678', 'old', 'lane'],
        ['Candle Lane', '-464,-345 -372,-362 -270,-340 -148,-352 8,-345', 'old', 'lane'],
        ['Saltmarket', '-110,-235 -145,-350 -128,-455 -165,-550 -118,-640', 'old'],
        ['Plumb Lane', '-470,-470 -362,-474 -252,-452 -128,-456 10,-440', 'old', 'lane'],
        ['Netloft Lane', '-456,-572 -390,-578 -298,-562 -165,-550 -34,-566', 'old', 'lane'],
        ['Coopers’ Yard', '-366,-362 -360,-474 -390,-578 -378,-668', 'old', 'lane'],
        ['Weighhouse Yard', '-52,-349 -42,-449', 'old', 'lane'],
        ['St Osric’s Gate', '-420,-190 -402,-50 -425,70 -418,128', 'old'],
        ['Tollbar Row', '-262,-225 -250,-100 -262,20 -235,96', 'old'],
        ['Gannet Lane', '-540,0 -402,-42 -252,-68 -72,-58', 'old', 'lane'],
        ['Almshouse Row', '-110,-235 -84,-150 -72,-58 -92,50 -120,110', 'old', 'lane'],
        ['Pinfold Lane', '-425,70 -340,42 -256,38 -92,50', 'old', 'lane'],
      ],
    },
  },
  {
    name: 'Loomside',
    label: [-640, 330],
    era: 'victorian',
    frontage: 'terrace',
    ring: path(
      '-560,-165 -540,10 -470,170 -402,320 -422,540 -542,718 -640,875 -735,815 -745,500 -790,200 -790,-128',
    ),
    layout: { by: 'grid', angle: -0.2, pitch: 58, across: 190, names: 'loomside' },
  },
  {
    name: 'Dockgate',
    label: [640, -310],
    era: 'victorian',
    frontage: 'terrace',
    ring: path(
      '322,-195 520,-133 760,-74 1000,-5 1008,-40 1000,-180 942,-352 828,-468 700,-505 610,-502 590,-530 345,-515 312,-458 330,-330',
    ),
    layout: { by: 'grid', angle: 0.16, pitch: 60, across: 175, names: 'dockgate' },
  },
  {
    name: 'Stationside',
    label: [620, 90],
    era: 'victorian',
    frontage: 'terrace',
    ring: path('318,-182 520,-124 760,-64 1005,8 980,150 895,222 720,230 470,216 258,180 264,110 300,-40'),
    layout: { by: 'grid', angle: 0.2, pitch: 57, across: 205, names: 'stationside' },
  },
  {
    name: 'Larkholm',
    label: [-1290, -260],
    era: 'interwar',
    frontage: 'semi',
    ring: path(
      '-1180,-75 -980,-65 -800,-130 -780,-320 -785,-560 -810,-684 -1000,-645 -1240,-684 -1520,-654 -1715,-508 -1822,-300 -1785,-60 -1618,95 -1400,125 -1195,165',
    ),
    layout: {
      by: 'crescents',
      centre: [-1290, -285],
      radii: [52, 128, 208, 288, 368, 446],
      avenues: [0.35, 1.3, 2.35, 3.4, 4.4, 5.4],
      closes: 'larkclose',
    },
  },
  {
    name: 'Beacon Side',
    label: [-985, 250],
    era: 'sixties',
    frontage: 'bungalow',
    ring: path(
      '-800,-122 -800,200 -755,500 -745,790 -825,752 -1008,568 -1128,400 -1188,170 -1178,-67 -985,-57',
    ),
    layout: {
      by: 'closes',
      streets: [
        ['Beacon Road', '-985,-60 -960,80 -985,230 -930,380 -880,540 -835,748'],
        ['Bonfire Lane', '-1188,150 -1080,170 -968,170 -800,190'],
        ['Watchman Road', '-1110,420 -1020,400 -925,395 -762,430'],
      ],
      step: 64,
      reach: [60, 125],
      room: 33,
      names: 'beacon',
    },
  },
]
