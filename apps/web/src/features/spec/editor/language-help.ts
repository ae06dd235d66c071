import { autocompletion, type Completion, type CompletionContext } from '@codemirror/autocomplete'
import type { Extension } from '@codemirror/state'
import { hoverTooltip } from '@codemirror/view'
import { completionsAt, hoverAt, type Hover, type Vocabulary } from '@coldfill/spec'

const sorts: Readonly<Record<string, string>> = {
  key: 'property',
  choice: 'enum',
  name: 'variable',
  unit: 'unit',
  snippet: 'text',
}

/** Keys, choices, names and units that fit at the cursor: while a word is typed, or on Ctrl+Space. */
const completion = (vocabulary: Vocabulary): Extension =>
  autocompletion({
    icons: false,
    override: [
      (context: CompletionContext) => {
        const found = completionsAt(context.state.doc.toString(), context.pos, vocabulary)
        if (!found || found.options.length === 0) return null
        if (!context.explicit && found.span.start === context.pos) return null
        return {
          from: found.span.start,
          to: found.span.end,
          options: found.options.map((option, at): Completion => ({
            label: option.label,
            apply: option.insert,
            detail: option.detail,
            info: option.doc,
            type: sorts[option.sort] ?? 'text',
            boost: -Math.min(at, 98),
          })),
        }
      },
    ],
  })

const paragraph = (text: string, className = ''): HTMLElement => {
  const element = document.createElement('p')
  element.textContent = text
  element.className = className
  return element
}

const drawn = (hover: Hover): HTMLElement => {
  const holder = document.createElement('div')
  holder.className = 'flex flex-col gap-1 px-2.5 py-1.5 font-sans text-[13px] leading-[18px]'
  holder.append(paragraph(hover.title, 'font-mono font-semibold'), paragraph(hover.doc))
  if (hover.value) holder.append(paragraph(`${hover.value.text}: ${hover.value.doc}`))
  if (hover.units.length > 0) holder.append(paragraph(`Units: ${hover.units.join(', ')}`, 'text-pencil'))
  if (hover.fallback) holder.append(paragraph(`Left out: ${hover.fallback}`, 'text-pencil'))
  if (hover.example) holder.append(paragraph(`Example: ${hover.example}`, 'font-mono text-pencil'))
  return holder
}

/** What a key means, with its units and what holds where it is left out. */
const hover = (vocabulary: Vocabulary): Extension =>
  hoverTooltip((view, position) => {
    const { doc } = view.state
    const found = hoverAt(doc.toString(), position, vocabulary)
    if (!found || found.range.start.line >= doc.lines || found.range.end.line >= doc.lines) return null
    const at = (place: { readonly line: number; readonly character: number }) => {
      const line = doc.line(place.line + 1)
      return Math.min(line.to, line.from + place.character)
    }
    return { pos: at(found.range.start), end: at(found.range.end), create: () => ({ dom: drawn(found) }) }
  })

/** Completion and hover of the spec language. */
export const languageHelp = (vocabulary: Vocabulary): Extension => [completion(vocabulary), hover(vocabulary)]
