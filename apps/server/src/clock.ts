/** The time of day, handed in so that tests can move it. */
export type Clock = () => Date

export const systemClock: Clock = () => new Date()
