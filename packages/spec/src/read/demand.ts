import { demandFields, fixtureField } from '../model/demand.ts'
import type { Located } from '../model/field.ts'
import type { DemandModel } from '../model/spec-model.ts'
import { wrongChoice } from './choice.ts'
import { type Context, entriesOf, type Entry, entryOf, keyAt, valueAt } from './context.ts'
import { readField, readFields } from './field.ts'
import { expectBlock } from './shape.ts'

const EXAMPLE = 'demand: { building: apartment house, fixtures: { lavatory: 60, shower: 30 } }'

const readFixtures = (context: Context, entry: Entry | undefined): Record<string, Located<number>> => {
  const block = entry && expectBlock(context, entry, 'fixtures: { lavatory: 60, shower: 30 }')
  const fixtures: Record<string, Located<number>> = {}
  if (!block) return fixtures
  const { fixtures: known } = context.vocabulary
  for (const each of entriesOf(block)) {
    if (!known.includes(each.key)) {
      wrongChoice(
        context,
        'CF-S081',
        keyAt(each),
        each.key,
        known,
        `There is no fixture \`${each.key}\` in the table of hot water demand.`,
      )
      continue
    }
    const number = readField(context, fixtureField, each)
    if (number) fixtures[each.key] = number
  }
  return fixtures
}

export const readDemand = (context: Context, entry: Entry | undefined): DemandModel | undefined => {
  const block = entry && expectBlock(context, entry, EXAMPLE)
  if (!block) return undefined
  const read = readFields(context, block, demandFields, { owner: '`demand`', others: ['fixtures'] })
  const { buildings } = context.vocabulary
  const building = entryOf(block, 'building')
  const known = read.building && buildings.includes(read.building.value)
  if (read.building && building && !known)
    wrongChoice(
      context,
      'CF-S080',
      valueAt(building),
      read.building.value,
      buildings,
      `There is no building \`${read.building.value}\` in the table of hot water demand.`,
    )
  return {
    path: block.path,
    range: context.report.lineIndex.range(block.span),
    fixtures: readFixtures(context, entryOf(block, 'fixtures')),
    ...(read.building && known && { building: read.building }),
    ...(read.people && { people: read.people }),
    ...(read.apartments && { apartments: read.apartments }),
  }
}
