/** What opens over a marker: built from elements, so that no word of a register is ever read as markup. */
import { BOARD_TYPE_NAMES } from '@/lib/homes/board-type'
import { clusterInWords } from './feature-words'
import { type Cluster, type HomePoint } from './homes-on-map'

function element(name: 'p' | 'a' | 'div', className: string, text = ''): HTMLElement {
  const made = document.createElement(name)
  made.className = className
  made.textContent = text
  return made
}

const link = (href: string, text: string): HTMLElement => {
  const made = element('a', 'link link-block font-semibold', text)
  made.setAttribute('href', href)
  return made
}

/** One home, with the way to its page. */
export function homePopup(home: HomePoint): HTMLElement {
  const box = element('div', 'min-w-44 text-sm')
  box.append(
    link(`/homes/${home.id}`, home.address),
    element('p', '', BOARD_TYPE_NAMES[home.boardType]),
    element(
      'p',
      '',
      home.standing.replace(/^./, (letter) => letter.toUpperCase()),
    ),
    element('p', 'tabular-nums', `Score ${Math.round(home.score).toLocaleString('en-GB')}`),
  )
  return box
}

/** Homes that share a place and cannot be drawn apart. */
export function clusterPopup(cluster: Cluster, listHref: string): HTMLElement {
  const box = element('div', 'min-w-52 text-sm')
  box.append(
    element('p', 'font-semibold', 'These homes share a place'),
    element('p', '', clusterInWords(cluster)),
  )
  box.append(link(listHref, 'List them'))
  return box
}
