import Link from 'next/link'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { ROLE_NAMES } from '@/lib/access/role'
import { type PersonLine } from './people-lines'
import { momentInWords } from './moment-in-words'
import { patchesInWords } from './patches-in-words'

/** Everybody with access: role, reach, since when, and for a manager the way to change it. */
export function PeopleTable({ people, mayManage }: { people: readonly PersonLine[]; mayManage: boolean }) {
  return (
    <Table caption="People with access">
      <thead>
        <Row>
          <HeadCell>Name</HeadCell>
          <HeadCell>E-mail address</HeadCell>
          <HeadCell>Role</HeadCell>
          <HeadCell>Sees</HeadCell>
          <HeadCell>Since</HeadCell>
          {mayManage && <HeadCell>Change</HeadCell>}
        </Row>
      </thead>
      <tbody>
        {people.map((person) => (
          <Row key={person.personId}>
            <RowHead>
              {person.name}
              {person.isSelf && <span className="font-normal text-slate"> (you)</span>}
            </RowHead>
            <Cell>{person.email}</Cell>
            <Cell>{ROLE_NAMES[person.role]}</Cell>
            <Cell>{patchesInWords(person.role, person.patchNames)}</Cell>
            <Cell className="whitespace-nowrap">{momentInWords(person.since)}</Cell>
            {mayManage && (
              <Cell>
                <Link href={`/people/${person.personId}`} className="link-block link">
                  Change<span className="sr-only"> access of {person.name}</span>
                </Link>
              </Cell>
            )}
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
