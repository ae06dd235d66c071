import { customType, timestamp } from 'drizzle-orm/pg-core'

/** A point in time, held in UTC. */
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' })

export const bytes = customType<{ data: Uint8Array; driverData: Uint8Array }>({
  dataType: () => 'bytea',
  fromDriver: (value) => Uint8Array.from(value),
})
