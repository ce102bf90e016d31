/** Names for streets that a pattern lays out, each used once. None is taken from a particular town. */

const named = (kind: string, words: string): string[] =>
  words.split(',').map((word) => `${word.trim()} ${kind}`)

export const STREET_NAMES = {
  loomside: named(
    'Street',
    `Shuttle, Bobbin, Heddle, Warp, Weft, Carder, Spindle, Teasel, Selvedge, Twill, Worsted, Fuller, Dyer, Mordant,
     Distaff, Calico, Hank, Treadle, Fustian, Skein, Reed, Tenter, Nap, Gauze, Muslin`,
  ),
  dockgate: named(
    'Street',
    `Halyard, Bowline, Ballast, Binnacle, Bosun, Mizzen, Caulker, Sextant, Tiller, Windlass, Topsail, Bollard,
     Keelson, Gunwale, Fender, Cutwater, Spinnaker, Lodestar, Jib, Rudder, Stanchion, Transom`,
  ),
  stationside: named(
    'Street',
    `Signal, Tender, Footplate, Semaphore, Pannier, Fishplate, Lampman, Sleeper, Regulator, Guard, Engine, Coupling,
     Turntable, Coaling, Platelayer, Buffer`,
  ),
  larkholm: named(
    'Crescent',
    `Skylark, Linnet, Fieldfare, Redstart, Whitethroat, Siskin, Dunnock, Stonechat, Goldcrest, Brambling, Twite,
     Pipit, Whinchat, Redpoll, Nuthatch, Bullfinch, Waxwing, Serin, Crossbill, Bunting, Firecrest, Dipper`,
  ),
  avenues: named(
    'Avenue',
    'Wheatear, Yellowhammer, Chaffinch, Wagtail, Mistle, Corncrake, Nightjar, Treecreeper',
  ),
  larkclose: named(
    'Close',
    'Wren, Wryneck, Martin, Ouzel, Hobby, Merlin, Swift, Shrike, Jackdaw, Rook, Hoopoe, Cuckoo, Starling, Kestrel',
  ),
  beacon: named(
    'Grove',
    `Lookout, Lamplight, Kindling, Tarbarrel, Firewatch, Bellman, Ember, Brazier, Taper, Wick, Tinder, Flint, Spill,
     Cresset, Gleam, Glimmer, Rushlight, Candela, Torch, Hearth, Cinder, Lantern Oak, Wildfire, Halo`,
  ),
  netherfold: named(
    'Walk',
    `Clover, Comfrey, Dodder, Fescue, Mallow, Medick, Melilot, Milkwort, Orchis, Ragwort, Sainfoin, Speedwell,
     Stitchwort, Tormentil, Vetch, Woodruff, Bugle, Cowslip, Cudweed, Eyebright, Hawkbit, Knapweed, Toadflax,
     Bedstraw, Loosestrife, Pignut, Sneezewort, Lady Fern, Bistort, Chicory, Mugwort, Dock Leaf`,
  ),
  curlew: named(
    'Close',
    `Godwit, Knot, Avocet, Turnstone, Dotterel, Whimbrel, Plover, Greenshank, Ruff, Sanderling, Lapwing, Redshank,
     Phalarope, Stint, Oystercatcher, Pratincole, Woodcock, Snipe, Dunlin, Stilt, Spoonbill, Bittern, Teal, Wigeon,
     Garganey, Pintail, Shoveler, Gadwall, Smew, Goldeneye, Scaup, Pochard, Eider, Scoter, Brent, Shelduck`,
  ),
  carrside: named(
    'Close',
    `Meadowsweet, Flag Iris, Kingcup, Water Mint, Bulrush, Sedge, Ragged Robin, Brooklime, Marestail, Arrowhead,
     Watercress, Fleabane, Angelica, Yellow Cress, Bogbean, Sundew, Butterwort, Cotton Grass, Bur Reed, Frogbit`,
  ),
  millrace: named(
    'Close',
    `Sluice, Millstone, Grist, Hopper, Penstock, Waterwheel, Flume, Headrace, Tailrace, Bolter, Meal, Spur Wheel,
     Damsel, Quern, Leat, Paddle, Bran, Husk, Stook, Sheaf, Flail, Winnow, Chaff, Grindle, Sack Hoist, Hurst`,
  ),
  northgate: named(
    'Drive',
    `Willowherb, Alder, Osier, Sallow, Hornbeam, Rowan Tree, Medlar, Quince, Damson, Bullace, Whitebeam, Spindleberry,
     Guelder, Wayfaring, Service Tree, Juniper`,
  ),
} satisfies Record<string, readonly string[]>
