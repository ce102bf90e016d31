import { reads } from '@/app/api/read'
import { FindHomes, findHomes } from '@/lib/use-cases/homes/find-homes'

export const GET = reads(FindHomes, findHomes)
