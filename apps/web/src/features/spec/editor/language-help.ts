import { autocompletion, type Completion, type CompletionContext, snippet } from '@codemirror/autocomplete'
import { StateEffect, StateField, type Extension } from '@codemirror/state'
import { hoverTooltip, type EditorView } from '@codemirror/view'
import { completionsAt, hoverAt, type Hover, type Vocabulary } from '@coldfill/spec'

const sorts: Readonly<Record<string, string>> = {
  key: 'property',
  choice: 'enum',
  name: 'variable',
  unit: 'unit',
  snippet: 'text',
}

const PLACEHOLDER = '…'

const WORD = /^[\p{L}\p{N} -]*$/u

/** Puts a completion in; Tab goes from one place that is to be filled in to the next. */
const insertion = (text: string): NonNullable<Completion['apply']> => {
  if (!text.includes(PLACEHOLDER)) return text
  return (view: EditorView, completion: Completion, from: number, to: number) => {
    // Lines after the first come indented, and are indented once more by the editor.
    const indent = /^\s*/u.exec(view.state.doc.lineAt(from).text)?.[0] ?? ''
    let place = 0
    const template = text
      .replaceAll(`\n${indent}`, '\n')
      .replaceAll(PLACEHOLDER, () => `\${${(place += 1)}:${PLACEHOLDER}}`)
    snippet(template)(view, completion, from, to)
  }
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
          // While a word goes on the list stays and is only narrowed; numbers bring other units.
          ...(found.options.every(({ sort }) => sort !== 'unit') ? { validFor: WORD } : {}),
          options: found.options.map((option, at): Completion => ({
            label: option.label,
            apply: insertion(option.insert),
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

/** What the last sizing made of a path, in words. */
export type Computed = (path: string) => readonly string[]

const setComputed = StateEffect.define<{ readonly of: Computed; readonly stale: boolean }>()

const computedField = StateField.define<{ readonly of: Computed; readonly stale: boolean }>({
  create: () => ({ of: () => [], stale: false }),
  update: (value, transaction) => {
    for (const effect of transaction.effects) if (effect.is(setComputed)) return effect.value
    return value
  },
})

/** Tells the hover what was computed; `stale` where the text has changed since. */
export const showComputed = (of: Computed, stale: boolean) => ({ effects: setComputed.of({ of, stale }) })

const drawn = (hover: Hover, computed: readonly string[], stale: boolean): HTMLElement => {
  const holder = document.createElement('div')
  holder.className = 'flex flex-col gap-1 px-2.5 py-1.5 font-sans text-[13px] leading-[18px]'
  holder.append(paragraph(hover.title, 'font-mono font-semibold'), paragraph(hover.doc))
  if (computed.length > 0) {
    const list = document.createElement('div')
    list.className = `border-l-[3px] border-l-steel pl-2 ${stale ? 'opacity-60' : ''}`
    list.append(...computed.map((line) => paragraph(line, 'figures font-mono text-[12.5px]')))
    if (stale) list.append(paragraph('Of the text before the last change.', 'text-pencil'))
    holder.append(list)
  }
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
    const computed = view.state.field(computedField)
    const at = (place: { readonly line: number; readonly character: number }) => {
      const line = doc.line(place.line + 1)
      return Math.min(line.to, line.from + place.character)
    }
    return {
      pos: at(found.range.start),
      end: at(found.range.end),
      create: () => ({ dom: drawn(found, computed.of(found.path), computed.stale) }),
    }
  })

/** Completion and hover of the spec language. */
export const languageHelp = (vocabulary: Vocabulary): Extension => [
  completion(vocabulary),
  computedField,
  hover(vocabulary),
]
