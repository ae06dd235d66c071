import type { Response } from 'supertest'

/** Parser for supertest that leaves the bytes of an answer as they are. */
export const binaryBody = (res: Response, done: (error: Error | null, body: Buffer) => void): void => {
  const chunks: Buffer[] = []
  const stream = res as unknown as NodeJS.ReadableStream
  stream.on('data', (chunk: Buffer) => chunks.push(chunk))
  stream.on('end', () => done(null, Buffer.concat(chunks)))
}
