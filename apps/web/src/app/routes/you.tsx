import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { useNavigate } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { Choice } from '#components/ui/choice.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { paths } from '#config/paths.ts'
import { signOut, useSession } from '#features/session/api/session.ts'
import { messageOf } from '#lib/api-error.ts'
import { clock } from '#lib/format.ts'
import { preferUnits, unitPreference } from '#lib/search-params.ts'
import { useStore } from '#lib/store.ts'
import { chooseTheme, themeStore } from '#lib/theme.ts'

const shortcuts: readonly (readonly [keys: string, where: string, does: string])[] = [
  ['Alt+1 … Alt+7', 'Project', 'Go to a sheet, in the order of the list'],
  ['Ctrl+S', 'Spec', 'Save'],
  ['Ctrl+Space', 'Spec', 'Completion'],
  ['F8, Shift+F8', 'Spec', 'Next and previous finding'],
  ['Ctrl+F', 'Spec', 'Search and replace'],
  ['Esc, then Tab', 'Spec', 'Leave the editor'],
  ['Arrows, Home, End, Ctrl+Home, Ctrl+End', 'Schedule', 'Move from cell to cell'],
  ['Enter', 'Schedule', 'Go to the trace of the cell; Esc comes back'],
  ['Shift+F2', 'Schedule', 'Start a redline on the cell'],
  ['Ctrl+Enter', 'Redline', 'Add to pending'],
]

export function Component() {
  const { user, expiresAt } = useSession()
  const theme = useStore(themeStore)
  const units = useStore(unitPreference)
  const navigate = useNavigate()
  const queryClient = useQueryClient()
  const [error, setError] = useState<unknown>(null)

  const leave = async () => {
    try {
      await signOut()
      queryClient.clear()
      await navigate(paths.signIn())
    } catch (failure) {
      setError(failure)
    }
  }

  return (
    <Sheet
      title="You"
      actions={<Button onClick={() => void leave()}>Sign out</Button>}
      bands={
        error ? (
          <Band tone="error" live="alert">
            {messageOf(error)}
          </Band>
        ) : null
      }
    >
      <div className="flex max-w-3xl flex-col gap-8">
        <dl className="grid grid-cols-[8rem_minmax(0,1fr)] gap-y-1.5 border-t-[3px] border-ink pt-3">
          <dt className="text-pencil">Name</dt>
          <dd className="font-semibold">{user.name}</dd>
          <dt className="text-pencil">E-mail</dt>
          <dd>{user.email}</dd>
          <dt className="text-pencil">Office</dt>
          <dd>{user.office.name}</dd>
          <dt className="text-pencil">Session</dt>
          <dd>on this device, until {clock(expiresAt)}</dd>
        </dl>
        <section>
          <SectionHeading>On this device</SectionHeading>
          <div className="flex flex-wrap gap-x-10 gap-y-4">
            <div>
              <p className="mb-1 text-cell font-semibold">Light</p>
              <Choice
                label="Light"
                value={theme}
                choices={[
                  { value: 'system', label: 'As the system' },
                  { value: 'light', label: 'Light' },
                  { value: 'dark', label: 'Dark' },
                ]}
                onChoose={chooseTheme}
              />
            </div>
            <div>
              <p className="mb-1 text-cell font-semibold">Units shown</p>
              <Choice
                label="Units shown"
                value={units}
                choices={[
                  { value: 'project', label: 'As the project' },
                  { value: 'US', label: 'US' },
                  { value: 'SI', label: 'SI' },
                ]}
                onChoose={preferUnits}
              />
            </div>
          </div>
        </section>
        <section>
          <SectionHeading>Keys</SectionHeading>
          <dl className="border-t border-hair">
            {shortcuts.map(([keys, where, does]) => (
              <div
                key={keys}
                className="grid gap-x-4 border-b border-hair py-1.5 desk:grid-cols-[17rem_6rem_minmax(0,1fr)]"
              >
                <dt className="font-mono text-cell">{keys}</dt>
                <dd className="text-pencil">{where}</dd>
                <dd>{does}</dd>
              </div>
            ))}
          </dl>
        </section>
      </div>
    </Sheet>
  )
}
