import { jsonSchema } from '@coldfill/spec'
import { vocabulary } from '@coldfill/sizing'
import { exitStatus } from '../exit-status.ts'
import { print } from '../io.ts'
import { readOptions } from '../options.ts'

/** `schema`: the JSON Schema of the spec. */
export const schema = async (args: readonly string[]): Promise<number> => {
  readOptions('schema', args, ['format'], 0)
  await print(JSON.stringify(jsonSchema(vocabulary), null, 2))
  return exitStatus.ok
}
