import type { RevisionFile } from '@coldfill/contract'
import { buttonClass } from '#components/ui/button.tsx'
import { fileSize } from '#lib/format.ts'

const kinds = {
  schedule: 'Equipment schedule, workbook',
  submittal: 'Submittal, document',
  pdf: 'Submittal, print of the document',
}

/** A file of a revision: what it is, size, fingerprint, and the way to get it. */
export const FileRow = ({ file }: { readonly file: RevisionFile }) => (
  <li className="border-b border-hair py-2.5">
    <div className="flex items-center justify-between gap-x-6 gap-y-2 max-desk:flex-col max-desk:items-start">
      <div className="min-w-0">
        <p className="font-semibold break-words">{file.name}</p>
        <p className="text-cell text-pencil">
          {kinds[file.kind]} · <span className="figures">{fileSize(file.size)}</span>
        </p>
      </div>
      <a href={file.href} download={file.name} aria-label={`Download ${file.name}`} className={buttonClass('plain')}>
        Download
      </a>
    </div>
    <p className="mt-1 font-mono text-zone break-all text-pencil">SHA-256 {file.sha256}</p>
  </li>
)
