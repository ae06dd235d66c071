import { revisionTitle, type Project, type Results } from '@coldfill/contract'
import { Band } from '#components/ui/band.tsx'
import { stateWord } from '#lib/words.ts'

/** Says which frozen content is shown, where it is not the one a reader would expect. */
export const ContentBand = ({ project, shown }: { readonly project: Project; readonly shown: Results | undefined }) => {
  if (!shown || shown.revision === null) return null
  const newest = project.revisions[0]
  const revision = project.revisions.find((one) => one.label === shown.revision)
  if (newest && revision && newest.id !== revision.id) {
    return (
      <Band
        tone="warning"
        title={`${revisionTitle(revision.label)} is ${stateWord(revision.state).toLowerCase()}; ${revisionTitle(newest.label)} is newer.`}
      />
    )
  }
  if (!project.permissions.seeWorkingCopy.allowed) return null
  return <Band title={`${revisionTitle(shown.revision)} is frozen.`}>The working copy may say something else.</Band>
}
