import type { Severity } from './finding.ts'

export type Layer = 'syntax' | 'spec' | 'engineering'

/** What the help says about a code. */
export interface Diagnostic {
  readonly title: string
  readonly severity: Severity
  readonly layer: Layer
  readonly what: string
  readonly why: string
  readonly fix: string
}

const define = (
  layer: Layer,
  severity: Severity,
  title: string,
  what: string,
  why: string,
  fix: string,
): Diagnostic => ({
  title,
  severity,
  layer,
  what,
  why,
  fix,
})

const syntax = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('syntax', 'error', title, what, why, fix)
const error = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('spec', 'error', title, what, why, fix)
const warning = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('spec', 'warning', title, what, why, fix)
const note = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('spec', 'note', title, what, why, fix)

/** Every finding of the syntax and the spec layer. A code is never given to another mistake. */
export const findingCodes = {
  'CF-Y001': syntax(
    'Text that does not belong',
    'Something stands where YAML expects a new key, a comma or the end of a block.',
    'The rest of the block cannot be told apart from it.',
    'Put each key on a line of its own as `key: value`. A text that holds quotation marks or brackets goes in quotes.',
  ),
  'CF-Y002': syntax(
    'Bracket or quotation mark left open',
    'A bracket, brace or quotation mark opens and does not close.',
    'Everything behind it would belong to it.',
    'Close it where it ends, or take it out.',
  ),
  'CF-Y003': syntax(
    'Colon missing behind a key',
    'A line inside a block is no `key: value`.',
    'Without the colon a line is a piece of text.',
    'Write a colon and a space behind the key.',
  ),
  'CF-Y004': syntax(
    'Wrong indentation',
    'A line begins in a column in which no block is open.',
    'Indentation says which block a key belongs to.',
    'Begin the keys of one block in the same column, two spaces further in than the key above them.',
  ),
  'CF-Y005': syntax(
    'Colon inside a text',
    'A value holds a colon and a space, or two keys stand on one line.',
    'A colon with a space behind it always ends a key.',
    'Put the text in quotes, or the second key on its own line.',
  ),
  'CF-Y006': syntax(
    'Anchor or alias',
    'The text uses `&name` or `*name`.',
    'Redlines and comparisons point to the place where a value is written, so each value is written where it holds.',
    'Write the value out. A text that begins with `&` or `*` goes in quotes.',
  ),
  'CF-Y007': syntax(
    'Tab in the indentation',
    'A line is indented with a tab.',
    'YAML takes only spaces, because tabs have no agreed width.',
    'Use two spaces for each level.',
  ),
  'CF-Y008': syntax(
    'Tag',
    'A value carries a tag such as `!!str`.',
    'A spec needs no types: numbers, texts and choices are told apart by their keys.',
    'Take the tag out. A text that begins with `!` goes in quotes.',
  ),
  'CF-Y009': syntax(
    'Directive',
    'A line begins with `%`, as in `%YAML 1.1`.',
    'It would change how `no`, `1:30` and other words are read. A spec is always YAML 1.2.',
    'Take the line out.',
  ),
  'CF-Y010': syntax(
    'Several documents',
    'A line `---` begins a second document.',
    'A file holds the spec of one project.',
    'Put the second spec into a file of its own.',
  ),
  'CF-Y011': syntax(
    'Merge key',
    'The key `<<` asks to take keys over from elsewhere.',
    'A spec says each value where it holds, so that a redline can point to it.',
    'Write the keys out.',
  ),
  'CF-Y012': syntax(
    'Nested too deep',
    'Maps and lists lie inside each other more than 64 levels deep.',
    'A spec needs eight levels at most; deeper text is a slip or an attack.',
    'Take out the brackets, braces or dashes that are not needed.',
  ),
  'CF-Y013': syntax(
    'Too many keys and values',
    'The text has more than 20,000 keys and values.',
    'Larger texts would slow down everyone who works on the project.',
    'Split the project into several specs.',
  ),
  'CF-Y014': syntax(
    'Key that is no word',
    'A key is a map or a list, or is written with `?`.',
    'Keys are words of the spec or marks from the drawings.',
    'Write a plain word or mark, a colon and a value.',
  ),
  'CF-Y015': syntax(
    'Text with a reserved beginning',
    'A text begins with `@`, a backtick, `%` or another character that YAML keeps for itself.',
    'Such a text is read only in quotes.',
    'Put the text in quotes.',
  ),
  'CF-Y016': syntax(
    'Control character',
    'The text holds an invisible control character.',
    'It cannot be printed and mostly comes from copying.',
    'Delete it.',
  ),
  'CF-Y017': syntax(
    'Unknown escape in double quotes',
    'A backslash in double quotes is followed by a letter that means nothing.',
    'In double quotes a backslash begins a special character.',
    'Use single quotes, or write the backslash twice.',
  ),
  'CF-Y018': syntax(
    'Key written twice',
    'The same key stands twice in one block.',
    'Only one of the two values can hold.',
    'Take one out, or rename it.',
  ),
  'CF-Y019': syntax(
    'Space missing behind a colon',
    'A key and its value are written together, as in `fill:50 °F`.',
    'YAML reads them as one text.',
    'Write a space behind the colon.',
  ),
  'CF-Y020': syntax(
    'Comma missing in braces',
    'Two keys in braces are not parted by a comma.',
    'Without it the second key belongs to the text of the first.',
    'Write `{ first: value, second: value }`.',
  ),
  'CF-Y021': syntax(
    'Text too long',
    'The text has more than a million characters.',
    'A spec of a large project has less than a tenth of that.',
    'Split the project into several specs.',
  ),
  'CF-Y022': syntax(
    'Empty spec',
    'Nothing is written, or comments only.',
    'There is nothing to read.',
    'Begin with `coldfill: 1`.',
  ),
  'CF-Y023': syntax(
    'Not a block of keys',
    'The text is a list or a single text.',
    'A spec is a block of keys: `coldfill`, `project`, `systems` and others.',
    'Begin with `coldfill: 1` and put `project:` and `systems:` below it.',
  ),
  'CF-Y024': define(
    'syntax',
    'note',
    'Comma in a text in braces',
    'A text in braces holds a comma and is not in quotes. It is read as one text.',
    'Other programs that read YAML end the text at the comma.',
    'Put the text in quotes.',
  ),
  'CF-S001': error(
    'Version missing',
    'The spec has no key `coldfill`.',
    'The version decides how the rest is read.',
    'Begin the spec with `coldfill: 1`.',
  ),
  'CF-S002': error(
    'Unknown version',
    'The version of the spec is not one that this program reads.',
    'Another version may give another meaning to the same key.',
    'Write `coldfill: 1`.',
  ),
  'CF-S003': error(
    'Unknown key',
    'A block has a key that does not belong to it.',
    'A key that nobody reads would look as if it counted.',
    'Use the nearest key, move it to the block that it belongs to, or take it out.',
  ),
  'CF-S004': error(
    'Key missing',
    'A block lacks a key that is needed.',
    'No documented default stands for it, so nothing can be sized without it.',
    'Put in the key with its value.',
  ),
  'CF-S005': error(
    'Wrong shape',
    'A block, a list or a single text stands where another of the three is due.',
    'The keys inside could not be told.',
    'Write the value as the example in the hint shows.',
  ),
  'CF-S006': error(
    'Nothing written',
    'A key stands without a value.',
    'An empty value is not a default: a default holds where the key is left out.',
    'Write a value, or take the key out.',
  ),
  'CF-S007': error(
    'Not one of the choices',
    'A value is none of the choices of its key.',
    'Each choice is a documented case; no other is known.',
    'Write one of the choices in the hint.',
  ),
  'CF-S008': error(
    'Unit missing',
    'A number stands where a number with a unit is due.',
    'A number alone could be psi or kPa, and nobody checking the schedule could tell.',
    'Write the unit behind the number.',
  ),
  'CF-S009': error(
    'Unknown unit',
    'The text behind the number is not a unit.',
    'Only units with a documented factor are converted.',
    'Write one of the units in the hint.',
  ),
  'CF-S010': error(
    'Unit of another kind',
    'The unit measures something else, as a length where a pressure is due.',
    'The two cannot be converted into each other.',
    'Write a unit of the kind that is due. A gauge pressure is written without suffix.',
  ),
  'CF-S011': error(
    'Not a number',
    'The text does not begin with a number.',
    'A quantity is a number and a unit.',
    'Write the number first, then the unit.',
  ),
  'CF-S012': error(
    'Comma between thousands',
    'A comma parts the thousands, as in `1,200`.',
    'In other countries the same comma marks decimals.',
    'Write the digits without a comma.',
  ),
  'CF-S013': error(
    'Decimal comma',
    'A comma marks the decimals, as in `12,5`.',
    'In other countries the same comma parts thousands.',
    'Write a decimal point.',
  ),
  'CF-S014': error(
    'Value out of range',
    'A value is below the least that makes sense, mostly zero.',
    'A size from such a value would mean nothing.',
    'Check sign and digits.',
  ),
  'CF-S015': error(
    'Not a whole number',
    'A whole number is due.',
    'Equipment, fixtures and vessels are counted.',
    'Write a whole number without a unit.',
  ),
  'CF-S016': error(
    'Neither yes nor no',
    'The key takes `yes` or `no`.',
    'Anything else would be a guess.',
    'Write `yes` or `no`.',
  ),
  'CF-S017': error(
    'Range of values',
    'A range such as `600..700 ft` is written.',
    'Ranges are kept for a later version.',
    'Write one value.',
  ),
  'CF-S018': error(
    'Not a plain number',
    'A number without a unit is due.',
    'The key counts or compares, so it has no unit.',
    'Write the number alone.',
  ),
  'CF-S019': error(
    'Still to be filled in',
    '`…` stands where a value is due.',
    'The key was put in without a value, so that none is made up.',
    'Write the value, or take the key out.',
  ),
  'CF-S020': error(
    'Unknown kind of vessel',
    '`kind` names no kind of vessel.',
    'The kind decides which keys and methods there are.',
    'Write one of the kinds in the hint.',
  ),
  'CF-S021': warning(
    'Kind not sized yet',
    'The vessel is of a kind that the language knows and this version does not size.',
    'It is left out of schedule and submittal, and must not be forgotten.',
    'Schedule the vessel by other means, or take it out of the spec.',
  ),
  'CF-S022': error(
    'Method not offered',
    'The method is not one by which this version sizes that kind of vessel.',
    'A method is offered only with its source and its published checks.',
    'Write one of the methods in the hint.',
  ),
  'CF-S023': error(
    'Vessel in the wrong system',
    'A vessel stands in a system whose service it does not fit.',
    'Its method would ask for readings that such a system does not have.',
    'Check `kind` of the vessel and `service` of the system.',
  ),
  'CF-S024': warning(
    'Key not used',
    'A key means nothing in a system of this service.',
    'It does not change any size, though it may look so.',
    'Take it out, or check `service`.',
  ),
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

export type FindingCode = keyof typeof findingCodes

export const isFindingCode = (code: string): code is FindingCode => Object.hasOwn(findingCodes, code)
