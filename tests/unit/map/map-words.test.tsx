// @vitest-environment happy-dom
import '@testing-library/jest-dom/vitest'
import { cleanup, render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, describe, expect, it } from 'vitest'
import { clusterInWords, homeInWords } from '@/components/map/feature-words'
import { type HomesOnMap } from '@/components/map/homes-on-map'
import { InView } from '@/components/map/in-view'
import { MapButtons, type MapMove } from '@/components/map/map-buttons'
import { MapLegend } from '@/components/map/map-legend'
import { NothingPlaced } from '@/components/map/nothing-placed'
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'

afterEach(cleanup)

const HOME = {
  id: '0190',
  address: '4 Plumb Lane',
  longitude: 1.6,
  latitude: 54.6,
  boardType: 'rewireable',
  standing: 'lapsed',
  score: 1_204.4,
} as const
const CLUSTER = {
  longitude: 1.61,
  latitude: 54.61,
  box: [1.6, 54.6, 1.62, 54.62],
  homes: 38,
  boards: { rewireable: 7, mixed: 2, cartridge: 1, breakers: 20, rcbo: 4, unknown: 4 },
  highestScore: 903.6,
} as const
const HOMES: HomesOnMap = {
  clusters: [CLUSTER],
  points: [HOME],
  inBox: 39,
  placed: 40,
  unplaced: 2,
  extent: null,
}

describe('the map in words', () => {
  it('says of a home and of a cluster what their marks say', () => {
    expect(homeInWords(HOME)).toBe('4 Plumb Lane: rewireable fuses, lapsed, score 1,204')
    expect(homeInWords({ ...HOME, boardType: 'rcbo' })).toBe('4 Plumb Lane: RCBOs, lapsed, score 1,204')
    expect(clusterInWords(CLUSTER)).toBe('38 homes: 9 with rewireable fuses, 4 not known; highest score 904')
  })

  it('lists every mark: a link to each home, a button to each cluster', async () => {
    const went: unknown[] = []
    render(<InView homes={HOMES} onCluster={(box) => went.push(box)} />)
    await userEvent.click(screen.getByText('What the map shows, in words (2)'))
    expect(screen.getByRole('link', { name: /4 Plumb Lane/ })).toHaveAttribute('href', '/homes/0190')
    await userEvent.click(screen.getByRole('button', { name: /^Go to 38 homes/ }))
    expect(went).toEqual([CLUSTER.box])
  })

  it('explains every kind of board in words', () => {
    render(<MapLegend />)
    const legend = screen.getByRole('region', { name: 'What the marks mean' })
    for (const name of Object.values(BOARD_TYPE_NAMES)) expect(within(legend).getByText(name)).toBeVisible()
    expect(within(legend).getByText(/score 1,000 or more/)).toBeVisible()
  })

  it('moves without dragging: each button has a name', async () => {
    const moves: MapMove[] = []
    render(<MapButtons onMove={(move) => moves.push(move)} />)
    for (const name of [
      'Zoom in',
      'Zoom out',
      'Move left',
      'Move up',
      'Move down',
      'Move right',
      'All homes',
    ])
      await userEvent.click(screen.getByRole('button', { name }))
    expect(moves).toEqual(['in', 'out', 'left', 'up', 'down', 'right', 'all'])
  })

  it('tells a filter that lets nothing through from homes without a place', () => {
    const { rerender } = render(<NothingPlaced unplaced={0} />)
    expect(screen.getByRole('heading')).toHaveTextContent('No home matches')
    rerender(<NothingPlaced unplaced={1_204} />)
    expect(screen.getByRole('heading')).toHaveTextContent('None of these 1,204 homes has a place yet')
  })
})
