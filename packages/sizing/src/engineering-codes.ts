import type { Severity } from '@coldfill/spec'

export interface EngineeringCodeHelp {
  readonly severity: Severity
  readonly title: string
  /** What was found. */
  readonly what: string
  /** Why it matters. */
  readonly why: string
  /** What to do. */
  readonly fix: string
  /** Source, and how sure the clause number is. */
  readonly source: string
}

const code = (
  severity: Severity,
  title: string,
  what: string,
  why: string,
  fix: string,
  source: string,
): EngineeringCodeHelp => ({ severity, title, what, why, fix, source })

const local = 'Local law and the authority having jurisdiction govern.'
const memory = 'clause from memory; verify against the adopted edition'

/** Every engineering finding, once. The page of a code is generated from its row. */
export const engineeringCodes = {
  'CF-E001': code(
    'error',
    'An input is missing',
    'A value that the method needs is not in the spec.',
    'Without it the vessel cannot be sized; a guess would hide in the schedule.',
    'Add the key that the message names.',
    'The method of the vessel.',
  ),
  'CF-E002': code(
    'error',
    'The system holds no water',
    'The contents of the system are missing or come to zero.',
    'The size of every expansion vessel is a share of the water that expands.',
    'List what holds the water under `contents`.',
    'The method of the vessel.',
  ),
  'CF-E003': code(
    'error',
    'Outside the validity of the fluid data',
    'A temperature or strength lies outside the range in which the property data hold.',
    'Properties are never extrapolated: below freezing or above the range the numbers would be invented.',
    'Check the temperatures and the strength of the fluid.',
    'IAPWS-IF97 for water; Melinder (IIR 2010) for glycol solutions.',
  ),
  'CF-E004': code(
    'error',
    'No method fits the vessel',
    'The method has no form for this construction, or the vessel lacks the keys it needs.',
    'Each method is published for certain constructions only.',
    'Choose another construction or another method.',
    'The method of the vessel.',
  ),
  'CF-E005': code(
    'error',
    'A step has no finite value',
    'A formula divides by zero or takes the root of a negative number with these inputs.',
    'The result would be meaningless.',
    'Check the inputs that the message names.',
    'The method of the vessel.',
  ),
  'CF-E010': code(
    'error',
    'The water does not get warmer',
    'The highest temperature is not above the lowest.',
    'Without a rise in temperature nothing expands.',
    'Give the hottest and the coldest the water gets, shutdown included.',
    'The method of the vessel.',
  ),
  'CF-E011': code(
    'error',
    'Nothing is left to expand',
    'Between these temperatures the piping grows as much as the water.',
    'Water hardly expands near 4 °C (39 °F); the net expansion is zero or negative.',
    'Check the temperatures and the material.',
    'IAPWS-IF97; ASHRAE Handbook, HVAC Systems and Equipment.',
  ),
  'CF-E012': code(
    'error',
    'Outside the use of the method',
    'The expansion by the formula of the method is not positive at this temperature.',
    'The formula was fitted to hotter water and turns negative below.',
    'Size by another method.',
    'The method of the vessel.',
  ),
  'CF-E013': code(
    'warning',
    'Outside the stated range of the method',
    'An input lies outside the range for which the source states the method.',
    'The result is shown as computed; nothing was clamped.',
    'Size by another method, or accept the finding with a reason.',
    'The source of the method.',
  ),
  'CF-E020': code(
    'error',
    'No room between fill and highest pressure',
    'The highest pressure allowed at the vessel is not above the pressure at which it is filled.',
    'A charged vessel takes up water only as its pressure rises; with no rise no vessel is large enough.',
    'Raise the relief valve setting, lower the static height above the vessel, or move the vessel higher in the building.',
    'Law of Boyle and Mariotte.',
  ),
  'CF-E021': code(
    'error',
    'Precharge at or above the highest pressure',
    'The gas charge is not below the highest pressure allowed.',
    'The vessel would never take up water.',
    'Set the precharge to the fill pressure.',
    'Law of Boyle and Mariotte.',
  ),
  'CF-E022': code(
    'error',
    'Incoming pressure at or above the highest pressure',
    'The pressure at the vessel is not below the highest pressure allowed there.',
    'No vessel is large enough; the relief valve would drip at every heating.',
    'Lower the regulator setting, or add a regulator. A relief valve is no expansion control.',
    `UPC 608.2, IPC 607.3. ${local}`,
  ),
  'CF-E023': code(
    'error',
    'No charge above atmosphere',
    'The precharge comes out at or below atmospheric pressure.',
    'A vessel without gas takes up no water.',
    'Check the supply and the regulator setting.',
    'The method of the vessel.',
  ),
  'CF-E024': code(
    'error',
    'Cut-out not above cut-in',
    'The pump stops at or below the pressure at which it starts.',
    'The tank would give no water.',
    'Raise `cut-out` or lower `cut-in`.',
    'Law of Boyle and Mariotte.',
  ),
  'CF-E025': code(
    'error',
    'Precharge above cut-in',
    'The gas charge of a pressure tank is above the pressure at which the pump starts.',
    'The tank is empty before the pump starts, and the pressure collapses.',
    'Charge the tank to about 2 psi below cut-in.',
    'Common practice, no source.',
  ),
  'CF-E030': code(
    'error',
    'The chosen vessel is too small',
    'The expansion does not fit into the chosen vessel.',
    'The relief valve would open.',
    'Choose a larger vessel.',
    'Law of Boyle and Mariotte.',
  ),
  'CF-E040': code(
    'warning',
    'Precharge differs from fill pressure',
    'The gas charge is given and is not the fill pressure.',
    'Charged below fill, part of the vessel is full of water before anything expands: half a bar can cost a quarter of the vessel. Charged above fill, the vessel holds no water when cold.',
    'Set the precharge to the fill pressure, with the vessel isolated and drained.',
    'ASHRAE Handbook, HVAC Systems and Equipment; common practice of the trade.',
  ),
  'CF-E041': code(
    'warning',
    'Little or no positive pressure at the top',
    'The fill pressure leaves less than the usual margin at the highest point when cold.',
    'Below atmosphere air is drawn in and cannot be vented.',
    'Keep 4 to 5 psi (0.3 bar) at the top: raise the fill pressure.',
    'EN 12828; ASHRAE Handbook, HVAC Systems and Equipment.',
  ),
  'CF-E042': code(
    'warning',
    'Water may boil at the top',
    'At the highest temperature the vapour pressure is above the pressure at the highest point.',
    'Steam pockets hammer and stop the flow. The vapour pressure is not added to the fill pressure silently.',
    'Raise `top-margin` by the vapour pressure, or limit the temperature.',
    'IAPWS-IF97 saturation pressure.',
  ),
  'CF-E043': code(
    'warning',
    'Vessel on the discharge side of the pump',
    'The vessel connects where the pump discharges, so the pump head is added to the fill pressure.',
    'The connection is the point of no pressure change: elsewhere the pressure falls by the pump head, and pumps may cavitate.',
    'Connect the vessel at the pump suction where it can be done.',
    'ASHRAE Handbook, HVAC Systems and Equipment, point of no pressure change.',
  ),
  'CF-E044': code(
    'warning',
    'Highest pressure too near the relief valve',
    'The maximum given for the vessel is above the relief valve setting less the margin.',
    'A valve that works near its setting weeps, and every weep is made up with fresh water.',
    'Lower `maximum`, or raise the relief valve setting within the rating of the equipment.',
    'EN 12828; common practice of the trade.',
  ),
  'CF-E045': code(
    'warning',
    'Smaller than the minimum of the mechanical code',
    'The required volume is below the least volume of the adopted mechanical code.',
    'The code equation is a legal floor for heating systems, whatever method sized the vessel.',
    'Schedule at least the code minimum, or document the approval of another basis.',
    `IMC 1009.2, UMC 1004.4 (${memory}). ${local}`,
  ),
  'CF-E050': code(
    'warning',
    'Closed domestic system without an expansion tank',
    'A backflow preventer or check valve closes a heated domestic system that has no thermal expansion tank.',
    'Heated water has nowhere to go: the pressure rises until the relief valve opens.',
    'Add a thermal expansion tank.',
    `UPC 608.3, IPC 607.3. ${local}`,
  ),
  'CF-E051': code(
    'warning',
    'Supply above 80 psi without a regulator',
    'The supply pressure is above 80 psi and no regulator is given.',
    'The model codes limit the pressure at fixtures to 80 psi.',
    'Add a regulator and charge the vessel to its setting.',
    `UPC 608.2, IPC 604.8. ${local}`,
  ),
  'CF-E052': code(
    'warning',
    'Regulator set above the supply',
    'The regulator is set higher than the supply pressure.',
    'A regulator never raises the pressure; the vessel stands at the supply pressure.',
    'Correct the supply or the regulator setting.',
    'Common practice, no source.',
  ),
  'CF-E053': code(
    'warning',
    'Storage below 60 °C (140 °F)',
    'Hot water is stored below 60 °C.',
    'Legionella grow in warm storage.',
    'Store at 60 °C or above with tempering at the outlets against scalding, or document another control.',
    `HSE HSG274 part 2; DVGW W 551. ${local}`,
  ),
  'CF-E054': code(
    'note',
    'Tempering against scalding',
    'Hot water is stored at 60 °C or above.',
    'Water at this temperature scalds within seconds.',
    'Provide tempering (master mixing and point-of-use valves) as the adopted code requires.',
    `ASSE 1017, ASSE 1070; UPC 409.4. ${local}`,
  ),
  'CF-E055': code(
    'warning',
    'Pressure above the limit of the plumbing code',
    'The highest pressure given for the vessel is above 80 psi while the adopted plumbing code limits it, thermal expansion included.',
    'Fixtures and appliances downstream are rated for 80 psi.',
    'Lower `maximum` to 80 psi.',
    `UPC 608.2, IPC 607.3. ${local}`,
  ),
  'CF-E060': code(
    'warning',
    'The fluid may freeze',
    'The lowest temperature is at or below the freezing point of the fluid.',
    'Ice blocks and bursts pipes and vessels.',
    'Raise the strength of the solution or the lowest temperature.',
    'Warmer of Melinder (IIR 2010) and the ASHRAE table for inhibited solutions.',
  ),
  'CF-E070': code(
    'note',
    'Two vessels on one system',
    'The system has more than one expansion tank.',
    'Vessels at different points of a loop shift the point of no pressure change.',
    'Connect them at one point and charge each for its own height.',
    'ASHRAE Handbook, HVAC Systems and Equipment.',
  ),
  'CF-E090': code(
    'warning',
    'Acceptance that matches nothing',
    'A finding is accepted in the text that does not occur there.',
    'A stale acceptance hides nothing today and may hide something tomorrow.',
    'Remove the line.',
    'Rule of this program.',
  ),
} as const satisfies Record<string, EngineeringCodeHelp>

export type EngineeringCode = keyof typeof engineeringCodes

export const isEngineeringCode = (text: string): text is EngineeringCode => Object.hasOwn(engineeringCodes, text)
