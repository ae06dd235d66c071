/** The pens and grounds of the printed sheets, as RRGGBB. Paper stays white: a printer has no cream. */
export const INK = '1D2B33'
export const PENCIL = '4A5A62'
export const RULE = '74828A'
export const HAIR = 'D3CCBA'
export const WELL = 'EDE8DB'
export const SHEET = 'FFFDF7'
export const STEEL = '1F5673'
export const OCHRE = '84540A'
export const OCHRE_WASH = 'F5E7C6'
export const FAULT = '8E1A66'
export const FAULT_WASH = 'F3DCEA'

/** A family that every word processor has in its own or a metric-compatible cut, so that pages break alike. */
export const BODY_FONT = 'Arial'
