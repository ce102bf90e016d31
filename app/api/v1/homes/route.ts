import { reads } from '@/app/api/read'
import { HomeQueryParams } from '@/lib/homes/home-query'
import { listHomes } from '@/lib/use-cases/homes/list-homes'

export const GET = reads(HomeQueryParams, listHomes)
