/** How far RCD protection reaches in a home. */
export const RCD_COVERS = ['none', 'sockets', 'part', 'all', 'unknown'] as const
export type RcdCover = (typeof RCD_COVERS)[number]

export const RCD_COVER_NAMES: Record<RcdCover, string> = {
  none: 'No RCD',
  sockets: 'Sockets only',
  part: 'Part',
  all: 'All circuits',
  unknown: 'Not known',
}
