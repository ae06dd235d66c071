import { useSyncExternalStore } from 'react'

export interface Store<T> {
  readonly get: () => T
  readonly set: (value: T) => void
  readonly subscribe: (listener: () => void) => () => void
}

/** A value outside React that components can follow. */
export const createStore = <T>(initial: T): Store<T> => {
  let value = initial
  const listeners = new Set<() => void>()
  return {
    get: () => value,
    set: (next) => {
      if (Object.is(next, value)) return
      value = next
      for (const listener of listeners) listener()
    },
    subscribe: (listener) => {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },
  }
}

export const useStore = <T>(store: Store<T>): T => useSyncExternalStore(store.subscribe, store.get)
