import { readFileSync } from 'node:fs'
import type { CatalogueRow } from '@coldfill/engine'
import { exitStatus, Stop } from './exit-status.ts'
import { fromHere } from './io.ts'

/** Rows of the catalogue that `--catalogue` names; problems go to standard error, and a catalogue without rows stops the command. */
export const readCatalogueOption = async (path: string | undefined): Promise<readonly CatalogueRow[] | undefined> => {
  if (path === undefined) return undefined
  let bytes: Uint8Array
  try {
    bytes = readFileSync(fromHere(path))
  } catch {
    throw new Stop(exitStatus.noInput, `${path}: no such file, or it cannot be read.`)
  }
  const { readCatalogueFile } = await import('@coldfill/documents')
  const { rows, problems } = await readCatalogueFile(bytes)
  for (const { line, column, message } of problems)
    process.stderr.write(`${path}:${line}: ${column ? `${column}: ` : ''}${message}\n`)
  if (rows.length === 0) throw new Stop(exitStatus.unreadable, `${path} has no vessel that can be read.`)
  return rows
}
