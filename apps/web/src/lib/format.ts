/** 48 213 bytes as `47.1 kB`. */
export const fileSize = (bytes: number): string => {
  if (bytes < 1024) return `${bytes} B`
  if (bytes < 1024 * 1024) return `${(bytes / 1024).toFixed(1)} kB`
  return `${(bytes / 1024 / 1024).toFixed(1)} MB`
}

const pad = (number: number) => String(number).padStart(2, '0')

/** ISO date of an instant in the reader's time zone. */
export const day = (iso: string): string => {
  const date = new Date(iso)
  if (Number.isNaN(date.getTime())) return iso
  return `${date.getFullYear()}-${pad(date.getMonth() + 1)}-${pad(date.getDate())}`
}

/** `14:02` on the day itself, `2026-11-03 14:02` on another. */
export const clock = (iso: string, now: Date = new Date()): string => {
  const date = new Date(iso)
  if (Number.isNaN(date.getTime())) return iso
  const time = `${pad(date.getHours())}:${pad(date.getMinutes())}`
  return day(iso) === day(now.toISOString()) ? time : `${day(iso)} ${time}`
}

export const plural = (count: number, one: string, many = `${one}s`): string => `${count} ${count === 1 ? one : many}`

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)
