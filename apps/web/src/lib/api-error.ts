import { Problem } from '@coldfill/contract'

/** An answer of the server that is not the one asked for, or no answer at all (`status` 0). */
export class ApiError extends Error {
  readonly status: number
  readonly code: string
  readonly problem: Problem | null
  constructor(status: number, code: string, message: string, problem: Problem | null = null) {
    super(message)
    this.name = 'ApiError'
    this.status = status
    this.code = code
    this.problem = problem
  }
  /** Worth trying again without changing anything. */
  get retryable(): boolean {
    return this.problem?.retryable ?? (this.status === 0 || this.status >= 500)
  }
}

export const apiErrorFrom = async (response: Response): Promise<ApiError> => {
  const body: unknown = await response.json().catch(() => null)
  const problem = Problem.safeParse(body)
  if (!problem.success) {
    return new ApiError(
      response.status,
      'unreadable_answer',
      `The server answered ${response.status} without saying why.`,
    )
  }
  return new ApiError(response.status, problem.data.code, problem.data.detail || problem.data.title, problem.data)
}

/** One sentence to show for any thrown thing. */
export const messageOf = (error: unknown): string => {
  if (error instanceof ApiError) return error.message
  return 'Something in the page failed. Reload it; what you typed in the spec is kept on this device.'
}

export const isStatus = (error: unknown, status: number): boolean =>
  error instanceof ApiError && error.status === status

/** The server's sentence about one field of the request, by JSON pointer. */
export const fieldError = (error: unknown, pointer: string): string | null =>
  error instanceof ApiError
    ? (error.problem?.errors?.find((issue) => issue.pointer === pointer)?.message ?? null)
    : null
