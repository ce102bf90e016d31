import Link from 'next/link'
import { Card } from '@/components/ui/card'
import { type HomeRow } from '@/lib/homes/home-row'

/** Half the height of what the map shows round a home, and half its width [degrees]; about 330 by 400 m either way. */
const HALF = { latitude: 0.003, longitude: 0.006 }

type Place = NonNullable<HomeRow['place']>

/**
 * The map round a home.
 * @example mapAround({ latitude: 54, longitude: 2 }) // '/map?within=1.994000,53.997000,2.006000,54.003000'
 */
export function mapAround({ latitude, longitude }: Place): string {
  const box = [
    longitude - HALF.longitude,
    latitude - HALF.latitude,
    longitude + HALF.longitude,
    latitude + HALF.latitude,
  ]
  return `/map?within=${box.map((edge) => edge.toFixed(6)).join(',')}`
}

/** Where the home lies, with the way to the map round it. */
export function HomePlaceCard({ place }: { place: HomeRow['place'] }) {
  return (
    <Card id="place" title="Place" className="print:hidden">
      {place ? (
        <>
          <p>
            Latitude <span className="figures">{place.latitude.toFixed(5)}</span>, longitude{' '}
            <span className="figures">{place.longitude.toFixed(5)}</span>
          </p>
          <p className="no-print mt-2">
            <Link href={mapAround(place)} className="link-block link">
              On the map, with the homes around it
            </Link>
          </p>
        </>
      ) : (
        <p className="text-slate">
          Not on the map. An import with its easting and northing, or with latitude and longitude, puts it
          there.
        </p>
      )}
    </Card>
  )
}
