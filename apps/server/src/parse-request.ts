import type { Request } from 'express'
import type { z } from 'zod'
import { AppError, badBody } from './errors.ts'

const pointer = (path: readonly PropertyKey[]): string =>
  path.map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('')

/** Places of the body whose text holds a NUL, which the database cannot keep. */
const nulsIn = (value: unknown, path: readonly PropertyKey[] = []): PropertyKey[][] => {
  if (typeof value === 'string') return value.includes('\0') ? [[...path]] : []
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, part]) => nulsIn(part, [...path, key]))
}

/** The body as the schema has it. @throws {AppError} 400 with every issue. */
export const parseBody = <T extends z.ZodType>(schema: T, req: Request): z.output<T> => {
  const body: unknown = req.body ?? {}
  const read = schema.safeParse(body)
  if (read.success) {
    const nuls = nulsIn(read.data)
    if (nuls.length === 0) return read.data
    throw badBody(
      nuls.map((path) => ({ pointer: pointer(path), message: 'Take out the NUL character: it cannot be stored.' })),
    )
  }
  throw badBody(
    read.error.issues.map((issue) => ({ pointer: pointer(issue.path), code: issue.code, message: issue.message })),
  )
}

/** A query parameter that may be left out. @throws {AppError} 400 where it is given twice. */
export const queryText = (req: Request, name: string): string | undefined => {
  const value = req.query[name]
  if (value === undefined || typeof value === 'string') return value
  throw new AppError(400, 'bad_query', 'The address is not right', `Give ${name} once.`)
}
