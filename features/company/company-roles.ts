import type { Role } from '@wedgeline/contract'
import { useSession } from '@/lib/session'

/** What the signed-in person is in a company; nothing in one that is not theirs. The server decides all the same. */
export function useCompanyRoles(companyId: string): readonly Role[] {
  const session = useSession()
  if (session.state !== 'in') return []
  return session.me.companies.find(({ id }) => id === companyId)?.roles ?? []
}
