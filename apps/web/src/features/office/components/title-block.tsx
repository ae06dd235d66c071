import { useQuery } from '@tanstack/react-query'
import { Loaded } from '#components/loaded.tsx'
import { clock } from '#lib/format.ts'
import { titleBlockQuery } from '../api/title-block.ts'
import { Logo } from './logo.tsx'
import { TitleBlockForm } from './title-block-form.tsx'

/** What the office prints on its documents: logo, texts and paper. */
export const TitleBlockPart = () => (
  <Loaded query={useQuery(titleBlockQuery)} what="Loading the title block">
    {(block) => (
      <div className="flex max-w-4xl flex-col gap-8">
        <p className="max-w-[80ch] text-read">
          This stands on the cover of every schedule and submittal that is issued from now on. Files that are issued
          already keep what they have.
          {block.changed ? (
            <span className="text-pencil">
              {' '}
              Changed last <span className="figures">{clock(block.changed.at)}</span> by {block.changed.by}.
            </span>
          ) : null}
        </p>
        <Logo logo={block.logo} />
        <TitleBlockForm block={block} />
      </div>
    )}
  </Loaded>
)
