import { type ReactNode } from 'react'
export function OfficeShell({ children }: { children: ReactNode }) { return <main className="page-width pb-16">{children}</main> }
