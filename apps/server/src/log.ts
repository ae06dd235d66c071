/** Where the server says what it does. */
export interface Log {
  info(text: string): void
  error(text: string): void
}

export const consoleLog: Log = {
  info: (text) => console.log(text),
  error: (text) => console.error(text),
}
