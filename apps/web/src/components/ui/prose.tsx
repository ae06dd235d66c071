/** A sentence in which what stands between backticks is text of a spec: a key, a value, a line to write. */
export const Prose = ({ text }: { readonly text: string }) =>
  text.split('`').map((part, at) =>
    at % 2 === 0 ? (
      part
    ) : (
      // The parts of one sentence never change places.
      // oxlint-disable-next-line react/no-array-index-key
      <code key={at} className="bg-well px-0.5 font-mono text-[0.92em] break-words">
        {part}
      </code>
    ),
  )
