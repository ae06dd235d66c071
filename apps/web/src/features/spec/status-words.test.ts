import { describe, expect, it } from 'vitest'
import { keptWords, sizedWords } from './status-words.ts'

const draft = { readOnly: false, saving: false, dirty: true, kept: true, savedAt: '14:02', version: 3 }
const sizing = { goodText: 'a', goodAt: '14:02', latestText: 'a', text: 'a', failure: null }

describe('where the text is kept', () => {
  it('is said while it is not saved', () => {
    expect(keptWords(draft)).toBe('Not saved; kept on this device')
    expect(keptWords({ ...draft, kept: false })).toBe('Not saved, and this browser keeps no draft')
  })
  it('is the server once it is saved', () => {
    expect(keptWords({ ...draft, dirty: false })).toBe('Saved 14:02, version 3')
  })
})

describe('what the results are worth', () => {
  it('says that a newer text is under way', () => {
    expect(sizedWords({ ...sizing, text: 'b' })).toBe('Sizing…')
  })
  it('dates the last results where the text has nothing to size', () => {
    expect(sizedWords({ ...sizing, text: 'b', latestText: 'b' })).toBe('Cannot be sized; results of 14:02')
    expect(sizedWords({ ...sizing, text: 'b', latestText: 'b', goodText: null })).toBe('Nothing to size')
  })
  it('dates the last results where the server did not answer, and says why', () => {
    expect(sizedWords({ ...sizing, text: 'b', failure: 'Too long.' })).toBe('Too long. Results of 14:02.')
    expect(sizedWords({ ...sizing, goodText: null, failure: 'Too long.' })).toBe('Too long.')
  })
})
