import type { Method } from '../../method.ts'
import { recoveryAndStorage } from './curve.ts'
import { din4708Dwellings, din4708Index } from './din-4708.ts'
import { ashraeFixture, ashraeFixtureUsablePart, aspeFixture } from './fixture.ts'
import { perApartment, perPerson } from './people.ts'

/** The more particular before the more general of one name. */
export const storageTankMethods: readonly Method[] = [
  ashraeFixtureUsablePart,
  ashraeFixture,
  aspeFixture,
  perPerson,
  perApartment,
  recoveryAndStorage,
  din4708Index,
  din4708Dwellings,
]
