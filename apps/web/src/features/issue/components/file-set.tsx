import type { FileSet as Made, RevisionFile } from '@coldfill/contract'
import { FileRow } from '#components/file-row.tsx'
import { missingWords } from '#lib/words.ts'

const contentsWords = ({ units, redlines, verification }: Made['contents']): string =>
  [
    `${units} units`,
    ...(redlines ? ['with redlines and answers'] : []),
    ...(verification ? ['with verification'] : []),
  ].join(', ')

/** The files of one making, with what they were made with and what could not be made. */
export const FileSet = ({
  set,
  files,
  made,
}: {
  readonly set: RevisionFile['set']
  readonly files: readonly RevisionFile[]
  /** Undefined for files of before contents were chosen. */
  readonly made: Made | undefined
}) => {
  const missing = made ? missingWords(made) : null
  return (
    <div className="mt-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-ink pb-1">
        <h4 className="font-semibold">{set === 'construction' ? 'Files for construction' : 'Files for review'}</h4>
        {made ? <p className="text-cell text-pencil">{contentsWords(made.contents)}</p> : null}
      </div>
      <ul>
        {files.map((file) => (
          <FileRow key={`${set} ${file.name}`} file={file} />
        ))}
      </ul>
      {missing ? <p className="mt-2 text-cell text-pencil">{missing}</p> : null}
    </div>
  )
}
