import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'

/** Where no home of the filter has a place. */
export function NothingPlaced({ unplaced }: { unplaced: number }) {
  if (unplaced === 0)
    return (
      <EmptyState title="No home matches" actions={<ButtonLink href="/map">Show every home</ButtonLink>}>
        Take off a filter above. Homes appear on the map as soon as they are in the register and have a place.
      </EmptyState>
    )
  return (
    <EmptyState
      title={
        unplaced === 1
          ? 'This home has no place yet'
          : `None of these ${unplaced.toLocaleString('en-GB')} homes has a place yet`
      }
      actions={<ButtonLink href="/homes">See them in the list</ButtonLink>}
    >
      A home is drawn once its easting and northing, or its latitude and longitude, are known. Import a list
      that has these columns; nothing else of the homes changes.
    </EmptyState>
  )
}
