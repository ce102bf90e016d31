import { Invalid } from '@/lib/errors/expected'

/**
 * The refusal of a file, told at the field that it was given in.
 * @example throw refuseFile('The file is empty.')
 */
export const refuseFile = (problem: string): Invalid => new Invalid([{ field: 'file', problem }])
