import type { ProjectResult } from '@coldfill/sizing'
import type { RedlineAnchor, RedlineEntry } from '../document-options.ts'
import { pathWords } from './path-words.ts'
import { sentenceCase } from '@coldfill/presentation'

/** Where a redline stands, as a reader finds it: `ET-1, precharge`, `assumption A3`. */
export const anchorWords = (anchor: RedlineAnchor, result: ProjectResult): string => {
  switch (anchor.type) {
    case 'row':
      return anchor.mark
    case 'cell': {
      const vessel = result.vessels.find(({ mark }) => mark === anchor.mark)
      const name = vessel?.results[anchor.column]?.name ?? anchor.column.replaceAll('-', ' ')
      return `${anchor.mark}, ${name}`
    }
    case 'assumption': {
      const found = result.assumptions.find(
        ({ id, number }) => id === anchor.assumption || number === anchor.assumption,
      )
      return found ? `Assumption ${found.number}, ${found.name}` : `Assumption ${anchor.assumption}`
    }
    case 'spec':
    default:
      return `Spec, ${pathWords(anchor.path)}`
  }
}

/** What a redline asks beside its text. */
export const redlineAsks = ({ quoted, proposedValue, mustAnswer }: RedlineEntry): string =>
  [
    ...(quoted === '' ? [] : [`on ${quoted}`]),
    ...(proposedValue === null || proposedValue === '' ? [] : [`proposes ${proposedValue}`]),
    ...(mustAnswer ? ['must be answered'] : []),
  ].join(', ')

/** `B. Lark, 2026-11-20` */
export const messageHead = ({ author, at }: RedlineEntry['messages'][number]): string =>
  `${author.name}, ${at.slice(0, 10)}`

export const stateWords = (redline: RedlineEntry): string => sentenceCase(redline.state)
