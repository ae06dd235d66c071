import { useState } from 'react'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { clock } from '#lib/format.ts'
import type { CompareWith } from '../compare-with.ts'
import type { Draft } from '../draft-store.ts'
import type { SpecDraft } from '../use-spec-draft.ts'
import { MergeBand } from './merge-band.tsx'

interface Props {
  readonly draft: SpecDraft
  /** What the text stands beside just now. */
  readonly compared: CompareWith | null
  readonly onCompare: (other: CompareWith) => void
}

const draftTitle = ({ part, baseVersion, at }: Draft): string => {
  if (part === 'saved over') return `Version ${baseVersion}, which you saved over, is kept on this device.`
  if (part === 'before merging') return `Your text from before the merge is kept on this device, typed ${clock(at)}.`
  if (part === 'merged') return `A merge that was not saved is kept on this device, made ${clock(at)}.`
  return `A text that was not saved is kept on this device, typed ${clock(at)}.`
}

const draftNote = ({ part, baseVersion }: Draft, version: number): string =>
  part === 'saved over' || baseVersion === version
    ? ''
    : `It was begun on version ${baseVersion}; version ${version} is saved. Taking it up sets the two beside each other.`

/** Says that somebody saved meanwhile, and offers texts that were typed here and never saved. Nothing is taken or lost unasked. */
export const SpecBands = ({ draft, compared, onCompare }: Props) => {
  const { conflict, offered, base } = draft
  const [unmergeable, setUnmergeable] = useState<number | null>(null)
  const newest = conflict?.version ?? base.version
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
                why={
                  unmergeable === conflict.version
                    ? 'One of the texts cannot be read, so only their lines can be compared.'
                    : null
                }
                onClick={() => {
                  if (draft.mergeBoth()) onCompare({ with: 'theirs' })
                  else setUnmergeable(conflict.version)
                }}
              >
                Merge both
              </Button>
              {compared?.with === 'theirs' ? null : (
                <Button onClick={() => onCompare({ with: 'theirs' })}>Compare both</Button>
              )}
              <Button onClick={draft.takeTheirs}>Take version {conflict.version}</Button>
              <Button busy={draft.saving} onClick={() => void draft.saveOver()}>
                Save mine over it
              </Button>
            </>
          }
        >
          {compared
            ? null
            : 'Your text is in the editor and kept on this device. Merging puts in what they changed elsewhere and asks where both changed the same; taking the other one keeps yours as a draft.'}
        </Band>
      ) : null}
      <MergeBand draft={draft} onCompare={compared?.with === 'theirs' ? null : () => onCompare({ with: 'theirs' })} />
      {compared
        ? null
        : offered
            // What a merge still under way began with is offered again when it is over.
            .filter((one) => one.slot !== draft.merged?.mineSlot)
            .map((one) => (
              <Band
                key={one.slot}
                title={draftTitle(one)}
                actions={
                  <>
                    <Button onClick={() => onCompare({ with: 'draft', slot: one.slot })}>Compare</Button>
                    <Button onClick={() => draft.takeUp(one)}>Take it up</Button>
                    <Button look="quiet" onClick={() => draft.throwAway(one)}>
                      Throw it away
                    </Button>
                  </>
                }
              >
                {draftNote(one, newest)}
              </Band>
            ))}
    </>
  )
}
