import { z } from 'zod'
import { reads } from '@/app/api/read'
import { homeQueryOf } from '@/lib/homes/home-query'
import { mapHomes, MapView } from '@/lib/use-cases/map/map-homes'

/** The part of the map on screen, and beside it the same parameters as the homes list. */
const Wanted = z.looseObject(MapView.shape).transform(({ box, zoom, ...params }) => ({
  box,
  zoom,
  query: homeQueryOf(params as Record<string, string>),
}))

/** Homes of a filter in one part of the map: clusters, and single homes. */
export const GET = reads(Wanted, mapHomes)
