/** What a group of refused rows has in common, by the reason's code. */
const TITLES: Record<string, string> = {
  contradicts_earlier_row: 'Another row of the file says something else for the same ticket',
  corrected_by_hand: 'The record was corrected by hand since',
  damaged_text: 'A letter was lost before the file came',
  date_in_future: 'The date lies in the future',
  date_in_mass: 'A spreadsheet has made a date of pounds and ounces',
  date_too_early: 'The date is too long ago',
  end_below_start: 'The end weight is below the start weight',
  impossible_hold: 'The hold is impossible',
  impossible_rise: 'The rise is impossible',
  impossible_vacuum: 'No gauge can show this vacuum',
  mass_too_large: 'The mass is too large',
  missing: 'Needed and empty',
  nameplate_not_positive: 'The nameplate charge must be above zero',
  negative_mass: 'A mass can’t be below zero',
  not_a_date: 'Not a date',
  not_a_mass: 'Not a mass',
  not_a_number: 'Not a number',
  not_a_pressure: 'Not a pressure',
  quote_not_closed: 'A quotation mark is not closed',
  too_few_cells: 'Too few cells',
  too_long: 'Too long',
  too_many_cells: 'Too many cells',
  unit_conflict: 'The file names two units for one figure',
  unit_missing: 'The unit is missing',
  unknown_refrigerant: 'Not a refrigerant of the catalogue',
  unknown_unit: 'Not a unit we know',
  unknown_word: 'Not one of the words of this column',
  weights_disagree: 'The weights and the recovered mass disagree',
};

/** The title of a group, or null when its sentence must speak for itself. */
export const reasonTitle = (code: string): string | null => TITLES[code] ?? null;
