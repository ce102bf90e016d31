import { type District } from './district'
import { NEWER_DISTRICTS } from './newer-districts'
import { OLDER_DISTRICTS } from './older-districts'

/** Every part of the town. */
export const DISTRICTS: readonly District[] = [...OLDER_DISTRICTS, ...NEWER_DISTRICTS]
