import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { useState } from 'react'
import { clock } from '#lib/format.ts'
import { MergeBand } from './merge-band.tsx'
import type { useSpecDraft } from '../use-spec-draft.ts'

interface Props {
  readonly draft: ReturnType<typeof useSpecDraft>
  readonly onCompare: (other: { readonly title: string; readonly text: string }) => void
}

/** Says that somebody saved meanwhile, and offers texts that were typed here and never saved. Nothing is taken or lost unasked. */
export const SpecBands = ({ draft, onCompare }: Props) => {
  const { conflict, offered, base } = draft
  const [unmergeable, setUnmergeable] = useState(false)
  return (
    <>
      {conflict ? (
        <Band
          tone="warning"
          live="alert"
          title={`${conflict.savedBy.name} saved version ${conflict.version} at ${clock(conflict.savedAt)}, while you were at version ${base.version}.`}
          actions={
            <>
              <Button
                look="main"
                why={unmergeable ? 'One of the texts cannot be read, so only their lines can be compared.' : null}
                onClick={() => setUnmergeable(!draft.mergeBoth())}
              >
                Merge both
              </Button>
              <Button onClick={() => onCompare({ title: `Saved version ${conflict.version}`, text: conflict.text })}>
                Compare both
              </Button>
              <Button onClick={draft.takeTheirs}>Take version {conflict.version}</Button>
              <Button busy={draft.saving} onClick={() => void draft.saveOver()}>
                Save mine over it
              </Button>
            </>
          }
        >
          Your text is in the editor and kept on this device. Merging puts in what they changed elsewhere and asks where
          both changed the same; taking the other one keeps yours as a draft.
        </Band>
      ) : null}
      <MergeBand draft={draft} />
      {offered.map((one) => (
        <Band
          key={one.slot}
          title={`A text that was not saved is kept on this device, typed ${clock(one.at)}.`}
          actions={
            <>
              <Button onClick={() => onCompare({ title: 'Kept draft', text: one.text })}>Compare</Button>
              <Button onClick={() => draft.takeUp(one)}>Take it up</Button>
              <Button look="quiet" onClick={() => draft.throwAway(one)}>
                Throw it away
              </Button>
            </>
          }
        >
          {one.baseVersion === base.version
            ? ''
            : `It was begun on version ${one.baseVersion}; version ${base.version} is saved.`}
        </Band>
      ))}
    </>
  )
}
