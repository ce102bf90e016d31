import Link from 'next/link'
import { ShareBar } from '@/components/drawings/share-bar'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'

type PatchCount = {
  readonly patch: { readonly id: string; readonly name: string } | null
  readonly homes: number
  readonly withRewireableWays: number
  readonly unknown: number
}

const whole = (n: number) => n.toLocaleString('en-GB')

/** Which patches still have rewireable fuses, with the homes of which it is not known counted apart. */
export function RewireableByPatch({
  patches,
  caption = 'Still on rewireable fuses, by patch',
}: {
  patches: readonly PatchCount[]
  caption?: string
}) {
  return (
    <Table caption={caption}>
      <thead>
        <tr>
          <HeadCell>Patch</HeadCell>
          <HeadCell numeric>Rewireable</HeadCell>
          <HeadCell numeric>Not known</HeadCell>
          <HeadCell numeric>Homes</HeadCell>
          <HeadCell>Share of patch</HeadCell>
        </tr>
      </thead>
      <tbody>
        {patches.map(({ patch, homes, withRewireableWays, unknown }) => (
          <Row key={patch?.id ?? 'none'}>
            <RowHead className="font-normal">{patch?.name ?? 'In no patch'}</RowHead>
            <Cell numeric>
              <Link
                className="link-block link"
                href={`/homes?board=rewireable-ways&patch=${patch?.id ?? 'none'}`}
              >
                {whole(withRewireableWays)}
              </Link>
            </Cell>
            <Cell numeric>
              <Link className="link-block link" href={`/homes?board=unknown&patch=${patch?.id ?? 'none'}`}>
                {whole(unknown)}
              </Link>
            </Cell>
            <Cell numeric>{whole(homes)}</Cell>
            <Cell>
              <ShareBar rewireable={withRewireableWays} unknown={unknown} total={homes} />
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
