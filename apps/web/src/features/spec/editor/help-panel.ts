import { StateEffect, StateField, type Extension } from '@codemirror/state'
import { EditorView, showPanel } from '@codemirror/view'

interface Mounted {
  readonly dom: HTMLElement
  /** What has the keyboard when the panel opens; the editor keeps it where there is none. */
  readonly focus?: HTMLElement
}

/** Draws a panel under the editor. */
export type PanelContent = (view: EditorView) => Mounted

const setContent = StateEffect.define<PanelContent | null>()

const content = StateField.define<PanelContent | null>({
  create: () => null,
  update: (value, transaction) => {
    for (const effect of transaction.effects) if (effect.is(setContent)) return effect.value
    // What a panel says is about a text that is no more.
    return transaction.docChanged ? null : value
  },
  provide: (field) =>
    showPanel.from(field, (draw) =>
      draw
        ? (view) => {
            const { dom, focus } = draw(view)
            return { dom, mount: () => focus?.focus() }
          }
        : null,
    ),
})

/** One panel at a time: uses, rename, fixes. It closes when the text changes. */
export const helpPanel: Extension = content

export const openPanel = (view: EditorView, draw: PanelContent): void => {
  view.dispatch({ effects: setContent.of(draw) })
  // The panel takes room from the text; the line that it is about stays in sight.
  view.dispatch({ effects: EditorView.scrollIntoView(view.state.selection.main.head, { y: 'nearest', yMargin: 40 }) })
}

/** Closes the panel and gives the keyboard back to the editor. True where one was open. */
export const closePanel = (view: EditorView): boolean => {
  if (view.state.field(content, false) == null) return false
  view.dispatch({ effects: setContent.of(null) })
  view.focus()
  return true
}

type Child = Node | string

export const element = (
  name: string,
  className: string,
  children: readonly Child[] = [],
  attributes: Readonly<Record<string, string>> = {},
): HTMLElement => {
  const made = document.createElement(name)
  if (className !== '') made.className = className
  for (const [key, value] of Object.entries(attributes)) made.setAttribute(key, value)
  made.append(...children)
  return made
}

export const panelButton = (label: string, onClick: () => void, main = false): HTMLButtonElement => {
  const button = document.createElement('button')
  button.type = 'button'
  button.className = `h-7 px-2.5 border-[1.5px] text-cell ${main ? 'border-steel bg-steel text-sheet font-semibold' : 'border-rule bg-sheet text-ink hover:border-ink'}`
  button.textContent = label
  button.addEventListener('click', onClick)
  return button
}

/** The frame of a panel: a heading, a way out, and what it holds. Escape closes it from anywhere inside. */
export const panelFrame = (view: EditorView, title: string, body: readonly Child[]): HTMLElement => {
  const close = panelButton('Close', () => closePanel(view))
  const frame = element(
    'section',
    'flex max-h-56 flex-col gap-1 overflow-y-auto border-t-2 border-ink bg-sheet px-3 py-1.5 font-sans text-[13px] leading-[18px] text-ink',
    [
      element('div', 'flex items-center justify-between gap-4', [
        element('p', 'font-semibold', [title], { role: 'status' }),
        close,
      ]),
      ...body,
    ],
    { 'aria-label': title },
  )
  frame.addEventListener('keydown', (event) => {
    // What is typed in a panel is not for the editor.
    event.stopPropagation()
    if (event.key !== 'Escape') return
    event.preventDefault()
    closePanel(view)
  })
  return frame
}

/** Says one sentence under the editor; the keyboard stays in the text. */
export const say = (view: EditorView, sentence: string): void =>
  openPanel(view, (opened) => ({ dom: panelFrame(opened, sentence, []) }))
