import { Select } from '@/components/ui/select'
import type { Me } from '@/lib/session'

export interface CompanyChoiceProps {
  readonly companies: Me['companies']
  readonly companyId: string
  readonly onChange: (companyId: string) => void
}

/** Whose job it becomes; there is nothing to ask in a person's only company. */
export function CompanyChoice({ companies, companyId, onChange }: CompanyChoiceProps) {
  if (companies.length < 2) return null
  return (
    <Select
      label="Company"
      options={companies.map(({ id, name }) => ({ value: id, label: name }))}
      value={companyId}
      onChange={onChange}
    />
  )
}
