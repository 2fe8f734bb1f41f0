import { ROLES, type Role } from '@wedgeline/contract'
import { View } from 'react-native'
import { Checkbox } from '@/components/ui/checkbox'
import { Text } from '@/components/ui/text'

const ROLE_HINTS: Readonly<Record<Role, string>> = {
  detailer: 'enters pours, anchors and steel',
  engineer: 'does that too; accepts readings, sets factors',
  drafter: 'sets marks and deliveries, exports schedules',
  inspector: 'reads what should be there on the deck',
  admin: 'people, roles and hardware',
}

export interface RoleBoxesProps {
  /** Names the group; read out. */
  readonly label: string
  readonly roles: readonly Role[]
  readonly onChange: (roles: readonly Role[]) => void
  readonly error?: string | undefined
}

/** Any number of roles for one person. */
export function RoleBoxes({ label, roles, onChange, error }: RoleBoxesProps) {
  return (
    <View role="group" aria-label={label}>
      {ROLES.map((role) => (
        <Checkbox
          key={role}
          label={role}
          hint={ROLE_HINTS[role]}
          checked={roles.includes(role)}
          onChange={(has) => onChange(ROLES.filter((each) => (each === role ? has : roles.includes(each))))}
        />
      ))}
      {error ? (
        <Text kind="small" tone="over">
          {error}
        </Text>
      ) : null}
    </View>
  )
}
