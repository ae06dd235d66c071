import { choice, text } from './field.ts'

/** Keys of a fluid, under `fluids:` or inline. */
export const fluidFields = {
  base: choice(
    {
      water: 'no additive',
      'propylene glycol': 'water with propylene glycol, the less toxic of the two',
      'ethylene glycol': 'water with ethylene glycol',
    },
    'What the fluid is made of.',
    'propylene glycol',
    { required: true },
  ),
  strength: text(
    'Part of glycol in the fluid. Whether it is by volume or by mass must be said: `% vol` or `% mass`.',
    '30 % vol',
    { fallback: 'none for water; must be said for glycol' },
  ),
}
