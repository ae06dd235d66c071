import { type Diagnostic, error, note, warning } from './diagnostic.ts'

/** Names that lead nowhere, and parts that do not go together, told when the parts are linked and compared. */
export const linkingCodes = {
  'CF-S030': error(
    'Glycol without strength',
    'A system names a glycol and no strength.',
    'Growth and density depend on the strength.',
    'Write base and strength, or name the fluid under `fluids`.',
  ),
  'CF-S031': error(
    'Unknown fluid',
    'A system names a fluid that is not under `fluids`.',
    'Its properties are not known.',
    'Write `water`, or the id of a fluid.',
  ),
  'CF-S032': error(
    'Strength of water',
    'Water is given a strength.',
    'One of the two must be wrong.',
    'Take the strength out, or name the glycol.',
  ),
  'CF-S033': error(
    'Strength out of range',
    'A strength is not between 0 and 100 %.',
    'No mixture has it.',
    'Check the digits.',
  ),
  'CF-S034': error(
    'Glycol in drinking water',
    'A domestic water system is filled with glycol.',
    'Domestic water is drunk.',
    'Take `fluid` out, or check `service`.',
  ),
  'CF-S040': error(
    'Unknown pipe',
    'No family of pipe has this name.',
    'Its inside diameter is not known.',
    'Write one of the families in the hint.',
  ),
  'CF-S041': error(
    'Unknown pipe size',
    'The family of pipe does not have this size.',
    'Its inside diameter is not known.',
    'Write one of the sizes next to it.',
  ),
  'CF-S042': error(
    'Unknown emitter',
    'No class of emitters or plant has this name.',
    'Its content for each unit of output is not known.',
    'Write one of the classes in the hint.',
  ),
  'CF-S043': error(
    'Unclear line of contents',
    'A line of `contents` does not say what holds the water.',
    'Equipment, pipes, estimates and known volumes are read differently.',
    'Begin the line with `equipment`, `pipe`, `estimate` or `volume`.',
  ),
  'CF-S050': error(
    'Unknown assumption',
    'No documented default has this id.',
    'Only a documented default can be replaced.',
    'Write one of the ids on the Basis sheet.',
  ),
  'CF-S051': error(
    'Value does not fit the assumption',
    'The value is none of the choices of the assumption.',
    'It could not take the place of the default.',
    'Write one of the choices in the hint.',
  ),
  'CF-S060': error(
    'Mark used twice',
    'Two vessels have the same mark.',
    'Redlines, schedule rows and drawings point to a vessel by its mark.',
    'Give one of them another mark.',
  ),
  'CF-S061': error(
    'Badly spelled mark',
    'An id or a mark holds spaces, dots or other signs, or is too long.',
    'Marks are parts of the path of a value, which has dots between its parts.',
    'Write letters and digits, parted by hyphens or underscores.',
  ),
  'CF-S062': note(
    'Nothing to size',
    'The spec has no vessels.',
    'Schedule and submittal would be empty.',
    'Put vessels into a system.',
  ),
  'CF-S070': error(
    'Acceptance without a reason',
    'A comment accepts a warning and gives no reason.',
    'The reason is printed beside the warning; without it nobody can judge it.',
    'Write `because` and the reason.',
  ),
  'CF-S071': warning(
    'Comment not understood',
    'A comment begins with `coldfill:` and goes on with something unknown.',
    'It was meant for this program, and has no effect.',
    'Write `# coldfill: accept CF-E021 because …`.',
  ),
  'CF-S080': error(
    'Unknown building',
    '`building` names no row of the table of hot water demand.',
    'Its demand factors are not known.',
    'Write one of the buildings in the hint.',
  ),
  'CF-S081': error(
    'Unknown fixture',
    'A fixture is not in the table of hot water demand.',
    'Its demand is not known.',
    'Write one of the fixtures in the hint.',
  ),
  'CF-S100': error(
    'Lowest temperature not below the highest',
    '`low` is not below `high`.',
    'Water that does not warm up does not expand.',
    'Swap the two, or mend the one that is wrong.',
  ),
  'CF-S101': error(
    'Cold water not below storage',
    '`cold` is not below `storage`.',
    'Water that is not heated does not expand.',
    'Swap the two, or mend the one that is wrong.',
  ),
  'CF-S102': error(
    'Cut-in not below cut-out',
    '`cut-in` is not below `cut-out`.',
    'The pump would never start.',
    'Swap the two, or mend the one that is wrong.',
  ),
} as const satisfies Record<string, Diagnostic>
