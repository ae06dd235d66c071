import { LOGO_LIMIT, type OfficeLogo } from '@coldfill/contract'
import { useRef, useState } from 'react'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { fileSize } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { removeLogo, uploadLogo } from '../api/title-block.ts'

/** The logo as it is, and the ways to put in another or none. */
export const Logo = ({ logo }: { readonly logo: OfficeLogo | null }) => {
  const picker = useRef<HTMLInputElement>(null)
  const { busy, error, run } = useAction()
  const [tooLarge, setTooLarge] = useState<string | null>(null)
  const upload = (file: File) => {
    setTooLarge(file.size > LOGO_LIMIT ? `${file.name} has ${fileSize(file.size)}; a logo may have 1 MB.` : null)
    if (file.size <= LOGO_LIMIT) void run(() => uploadLogo(file))
  }
  return (
    <section>
      <SectionHeading note="PNG or JPEG, at most 1 MB">Logo</SectionHeading>
      <div className="flex flex-col gap-3 border-t-2 border-ink pt-3">
        {logo ? (
          <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
            {/* Paper is white in either theme. */}
            <div className="keeps-colour flex h-24 w-64 max-w-full items-center justify-center border border-rule bg-[#fff] p-3">
              <img src={logo.href} alt="Logo of the office" className="max-h-full max-w-full object-contain" />
            </div>
            <div>
              <p className="font-semibold break-all">{logo.fileName}</p>
              <p className="figures text-cell text-pencil">
                {logo.width} × {logo.height} pixels, {fileSize(logo.size)}
              </p>
            </div>
          </div>
        ) : (
          <p className="text-pencil">No logo: the covers begin with the title.</p>
        )}
        <div className="flex flex-wrap gap-2">
          <input
            ref={picker}
            type="file"
            accept=".png,.jpg,.jpeg,image/png,image/jpeg"
            aria-label="Logo file, PNG or JPEG"
            className="sr-only"
            tabIndex={-1}
            onChange={(event) => {
              const file = event.target.files?.[0]
              event.target.value = ''
              if (file) upload(file)
            }}
          />
          <Button busy={busy} onClick={() => picker.current?.click()}>
            {logo ? 'Replace the logo' : 'Upload a logo'}
          </Button>
          {logo ? (
            <Button look="quiet" busy={busy} onClick={() => void run(removeLogo)}>
              Remove it
            </Button>
          ) : null}
        </div>
        {tooLarge ? (
          <p role="alert" className="text-cell font-medium text-fault">
            {tooLarge}
          </p>
        ) : null}
        <Failure error={error} />
      </div>
    </section>
  )
}
