import { type Diagnostic, error, warning } from './diagnostic.ts'

/** Mistakes in a key, a value or a vessel, told while the text is read. */
export const readingCodes = {
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
} as const satisfies Record<string, Diagnostic>
