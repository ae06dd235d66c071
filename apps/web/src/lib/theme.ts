import { createStore } from './store.ts'

export type Theme = 'system' | 'light' | 'dark'
export const THEMES: readonly Theme[] = ['system', 'light', 'dark']

const KEY = 'coldfill.theme'
const isTheme = (text: string | null): text is Theme => THEMES.some((theme) => theme === text)

const stored = (): Theme => {
  try {
    const text = localStorage.getItem(KEY)
    return isTheme(text) ? text : 'system'
  } catch {
    return 'system'
  }
}

export const themeStore = createStore<Theme>('system')

/** Shows a theme and keeps the choice on this device. Printing is always light. */
export const chooseTheme = (theme: Theme): void => {
  document.documentElement.dataset['theme'] = theme
  themeStore.set(theme)
  try {
    localStorage.setItem(KEY, theme)
  } catch {
    // A browser that keeps nothing still shows the theme until the page is closed.
  }
}

export const startTheme = (): void => chooseTheme(stored())
