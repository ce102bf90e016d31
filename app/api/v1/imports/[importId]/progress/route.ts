import { reads } from '@/app/api/read'
import { ImportProgress, showImportProgress } from '@/lib/use-cases/imports/show-import'

export const GET = reads(ImportProgress, showImportProgress)
