export function findProgram(name: string): string | null
export function programPath(name: string): string
export function installIfMissing(wanted?: {
  debianPackage: string
  programs: string[]
}): 'present' | 'installed'
