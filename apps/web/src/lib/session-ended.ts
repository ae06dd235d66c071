import { createStore } from './store.ts'

/** True once the server has said that the session is over; the frame then offers to sign in again and nothing typed is lost. */
export const sessionEnded = createStore(false)
