import { choiceCodes } from './engineering-codes/choice.ts'
import { methodCodes } from './engineering-codes/method.ts'
import { pressureCodes } from './engineering-codes/pressures.ts'
import { systemCodes } from './engineering-codes/system.ts'

export type { EngineeringCodeHelp } from './engineering-codes/code.ts'

/** Every engineering finding, once. The page of a code is generated from its row. */
export const engineeringCodes = { ...methodCodes, ...choiceCodes, ...pressureCodes, ...systemCodes } as const

export type EngineeringCode = keyof typeof engineeringCodes

export const isEngineeringCode = (text: string): text is EngineeringCode => Object.hasOwn(engineeringCodes, text)
