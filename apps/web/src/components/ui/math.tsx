/** A drawn formula. The markup comes from the formula package alone, never from a person. */
export const Formula = ({ markup, block = false }: { readonly markup: string; readonly block?: boolean }) =>
  block ? (
    <div className="max-w-full overflow-x-auto py-1 " dangerouslySetInnerHTML={{ __html: markup }} />
  ) : (
    <span dangerouslySetInnerHTML={{ __html: markup }} />
  )
