import { AppRegistry } from 'react-native'
import { Providers } from '@/features/shell/providers'
import { WorkShell } from '@/features/shell/work-shell'
import { KitPage } from './kit-page'

const ACCOUNT = {
  person: 'Rowan Tilley',
  company: 'Quillmarsh Detailing',
  items: [
    { key: 'hardware', label: 'Hardware', href: '/' as const },
    { key: 'people', label: 'People', href: '/' as const },
  ],
  onSignOut: () => {},
}

function Kit() {
  return (
    <Providers>
      <WorkShell account={ACCOUNT}>
        <KitPage />
      </WorkShell>
    </Providers>
  )
}

AppRegistry.registerComponent('kit', () => Kit)
AppRegistry.runApplication('kit', { rootTag: document.getElementById('root') })
