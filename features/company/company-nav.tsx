import { NavBar } from '@/components/ui/nav-bar'

/** The pages of one company. */
export function CompanyNav({ companyId, here }: { companyId: string; here: 'hardware' | 'people' | 'company' }) {
  return (
    <NavBar
      label="Pages of the company"
      items={[
        { href: `/companies/${companyId}/hardware`, label: 'Hardware', isHere: here === 'hardware' },
        { href: `/companies/${companyId}/people`, label: 'People', isHere: here === 'people' },
        { href: `/companies/${companyId}`, label: 'Company', isHere: here === 'company' },
      ]}
    />
  )
}
