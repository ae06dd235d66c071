import type { z } from 'zod'
import { ApiError, apiErrorFrom } from './api-error.ts'
import { sessionEnded } from './session-ended.ts'

type Schema<T> = z.ZodType<T>
interface Options {
  readonly signal?: AbortSignal
}

const send = async (method: string, path: string, body: unknown, options: Options): Promise<Response> => {
  const headers: Record<string, string> = { Accept: 'application/json' }
  // The server takes writes only with this header, which no foreign page can set.
  if (method !== 'GET') headers['X-Requested-With'] = 'coldfill'
  if (body !== undefined) headers['Content-Type'] = 'application/json'
  let response: Response
  try {
    response = await fetch(path, {
      method,
      headers,
      credentials: 'same-origin',
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
      ...(options.signal ? { signal: options.signal } : {}),
    })
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error
    throw new ApiError(0, 'no_answer', 'The server does not answer. Check the connection and try again.')
  }
  // Asking who is signed in is answered by 401 before anyone is; that is no session that ended.
  if (response.status === 401 && path !== '/api/session') sessionEnded.set(true)
  if (!response.ok) throw await apiErrorFrom(response)
  return response
}

const read = async <T>(response: Response, schema: Schema<T>): Promise<T> => {
  const parsed = schema.safeParse(await response.json().catch(() => null))
  if (parsed.success) return parsed.data
  throw new ApiError(
    response.status,
    'unexpected_answer',
    'The server and this page are of different versions. Reload the page.',
  )
}

export const api = {
  get: async <T>(path: string, schema: Schema<T>, options: Options = {}): Promise<T> =>
    read(await send('GET', path, undefined, options), schema),
  post: async <T>(path: string, body: unknown, schema: Schema<T>, options: Options = {}): Promise<T> =>
    read(await send('POST', path, body, options), schema),
  put: async <T>(path: string, body: unknown, schema: Schema<T>, options: Options = {}): Promise<T> =>
    read(await send('PUT', path, body, options), schema),
  patch: async <T>(path: string, body: unknown, schema: Schema<T>, options: Options = {}): Promise<T> =>
    read(await send('PATCH', path, body, options), schema),
  /** A write whose answer, if any, is of no interest. */
  act: async (method: 'POST' | 'DELETE', path: string, body?: unknown): Promise<void> => {
    await send(method, path, body, {})
  },
}

/** Address of a project's resource on the server. */
export const projectApi = (number: string, rest = ''): string => `/api/projects/${encodeURIComponent(number)}${rest}`
