/** Text of a field of a form; empty where there is none or where it is a file. */
export const formText = (form: FormData, name: string): string => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}
