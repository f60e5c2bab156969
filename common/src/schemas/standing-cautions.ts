/** Cautions that every screen and sheet carries; they stand here once. */
export const STANDING_CAUTIONS = [
  'This sheet dimensions insulation; it is no permit to work. Approach and live-work distances come from the safety rules in force.',
  'Local codes and licensed practice decide.',
  'Counts hold for complete, healthy strings.',
  'Rules of thumb are for checking, not for ordering.',
  'Alternating current only.',
  'Uncontrolled when printed: look up the verification code.',
] as const;

/** What the method does not judge and a reader has to think of, as it applies to the site. */
export const SITE_CAUTIONS = [
  'Ice and snow on the string, galloping and bird streamers are not judged.',
  'Shattering of glass, coatings and washing are not judged.',
  'Strings of mixed units, and coupling sizes of units beside each other, are to be checked by hand.',
] as const;

/** Also on every sheet, each a value or "not required", never blank. */
export const SHEET_ITEMS = [
  'Radio-interference and corona limits',
  'Fault current and time',
  'Puncture or steep-front test',
  'Locking type',
  'Corrosion class for pollution type B',
  'Shield wire and arresters assumed',
  'Minimum temperature',
  'Length limits of the set',
] as const;
