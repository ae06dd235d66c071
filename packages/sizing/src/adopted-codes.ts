import type { SpecModel } from '@coldfill/spec'

const adopts = (spec: SpecModel, which: 'plumbing' | 'mechanical', names: RegExp): boolean =>
  names.test(spec.project.codes[which]?.value ?? '')

/** Whether the adopted plumbing code limits the pressure at fixtures to 80 psi, thermal expansion included. */
export const adoptsPlumbingCap = (spec: SpecModel): boolean =>
  adopts(spec, 'plumbing', /\b(UPC|IPC|(Uniform|International) Plumbing Code)\b/i)

/** Whether the adopted mechanical code has a least volume for the expansion tanks of heating systems. */
export const adoptsCodeMinimum = (spec: SpecModel): boolean =>
  adopts(spec, 'mechanical', /\b(IMC|UMC|(Uniform|International) Mechanical Code)\b/i) ||
  adopts(spec, 'mechanical', /\bASME\b.*\bIV\b/i)
