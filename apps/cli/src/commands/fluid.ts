import { fluid as fluidOf, inValidity, type FluidBase } from '@coldfill/engine'
import { engineeringCodes } from '@coldfill/sizing'
import { parseQuantity } from '@coldfill/units'
import { exitStatus, Stop } from '../exit-status.ts'
import { print } from '../io.ts'
import { readOptions } from '../options.ts'

const bases: readonly FluidBase[] = ['water', 'propylene glycol', 'ethylene glycol']

const parseFluid = (text: string): { base: FluidBase; strength?: { value: number; by: 'volume' | 'mass' } } => {
  const base = bases.find((name) => text.trim().toLowerCase().startsWith(name))
  if (!base)
    throw new Stop(
      exitStatus.usage,
      `--fluid takes ${bases.join(', ')}, glycols with a strength as "40 % mass"; not "${text}".`,
    )
  const rest = text.trim().slice(base.length).trim()
  if (rest === '') return { base }
  const match = /^(\d+(?:\.\d+)?)\s*%\s*(vol|volume|mass)$/i.exec(rest)
  if (!match)
    throw new Stop(exitStatus.usage, `The strength "${rest}" is not understood: write "40 % vol" or "40 % mass".`)
  return {
    base,
    strength: { value: Number(match[1]) / 100, by: match[2]?.toLowerCase() === 'mass' ? 'mass' : 'volume' },
  }
}

const refuse = async (json: boolean, message: string, hint: string): Promise<number> => {
  const { severity } = engineeringCodes['CF-E003']
  const zero = { start: { line: 0, character: 0 }, end: { line: 0, character: 0 } }
  const finding = { code: 'CF-E003', severity, message, hint, path: '', range: zero, related: [], fixes: [] }
  if (json) await print(JSON.stringify({ findings: [finding] }, null, 2))
  process.stderr.write(`${severity} CF-E003: ${message}\n    ${hint}\n`)
  return exitStatus.findings
}

/** `fluid --fluid "…" --temperature "…"`: density, specific volume and freezing point as the engine uses them. */
export const fluid = async (args: readonly string[]): Promise<number> => {
  const options = readOptions('fluid', args, ['format', 'fluid', 'temperature', 'pressure', 'fail-on'], 0)
  if (options.fluid === undefined || options.temperature === undefined)
    throw new Stop(exitStatus.usage, 'fluid needs --fluid "propylene glycol 40 % mass" and --temperature "20 °C".')
  const json = options.format === 'json'
  const { base, strength } = parseFluid(options.fluid)
  const temperature = parseQuantity(options.temperature, ['temperature'])
  if (!temperature.ok) throw new Stop(exitStatus.usage, `--temperature: ${temperature.problem.message}`)
  const pressure =
    options.pressure === undefined
      ? undefined
      : parseQuantity(options.pressure, ['absolute pressure', 'gauge pressure'])
  if (pressure && !pressure.ok) throw new Stop(exitStatus.usage, `--pressure: ${pressure.problem.message}`)
  const choice = fluidOf(base, strength)
  if (!choice.ok) return refuse(json, choice.message, 'Check the strength of the solution.')
  const T = temperature.quantity.value
  const P = pressure?.ok
    ? pressure.quantity.value + (pressure.quantity.kind === 'gauge pressure' ? 101325 : 0)
    : undefined
  const celsius = (kelvin: number) => kelvin - 273.15
  const { label, validity, freezing } = choice.fluid
  const range = `${celsius(validity.least).toFixed(1)} to ${celsius(validity.most).toFixed(1)} °C`
  if (!inValidity(validity, T))
    return refuse(
      json,
      `${options.temperature} is outside the range of the data for ${label}, ${range}.`,
      'Properties are never extrapolated.',
    )
  const density = choice.fluid.density(T, P)
  if (!Number.isFinite(density))
    return refuse(
      json,
      `${label} is not a liquid at ${options.temperature} and ${options.pressure ?? 'saturation'}.`,
      'Raise the pressure or lower the temperature.',
    )
  const result = {
    density: { value: density, unit: 'kg/m3' },
    'specific-volume': { value: 1 / density, unit: 'm3/kg' },
    freezing: { value: celsius(freezing), unit: '°C' },
  }
  if (json) await print(JSON.stringify(result, null, 2))
  else
    await print(
      [
        `${label} at ${options.temperature}${options.pressure === undefined ? ' (saturated liquid)' : `, ${options.pressure}`}`,
        `density          ${density.toPrecision(7)} kg/m3`,
        `specific volume  ${(1 / density).toPrecision(7)} m3/kg`,
        `freezing         ${celsius(freezing).toFixed(2)} °C`,
        `valid            ${range}`,
      ].join('\n'),
    )
  return exitStatus.ok
}
