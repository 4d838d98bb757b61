/**
 * Calendar dates as whole numbers: days since 1 January 1970, Gregorian throughout. Plain integer
 * arithmetic, so that no time zone and no summer time can move a date.
 */

const FIRST = toDayNumber(1, 1, 1);
const LAST = toDayNumber(9999, 12, 31);
const DAYS_IN_400_YEARS = 146_097;

function toDayNumber(year: number, month: number, day: number): number {
  // Years that begin in March: the leap day is then the last of its year.
  const y = month > 2 ? year : year - 1;
  const dayOfYear = Math.floor((153 * (month + (month > 2 ? -3 : 9)) + 2) / 5) + day - 1;
  return 365 * y + Math.floor(y / 4) - Math.floor(y / 100) + Math.floor(y / 400) + dayOfYear - 719_468;
}

/** Day number of an ISO date (YYYY-MM-DD). Throws a RangeError where the text is none. */
export function dayNumber(date: string): number {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(date);
  const number = match ? toDayNumber(Number(match[1]), Number(match[2]), Number(match[3])) : Number.NaN;
  // A date that is none (30 February) comes back as another one.
  if (Number.isNaN(number) || number < FIRST || isoDate(number) !== date) {
    throw new RangeError(`“${date}” is not a date of the form YYYY-MM-DD.`);
  }
  return number;
}

/**
 * ISO date of a day number. What lies outside the years 1 to 9999, which the form can write, is shown as the
 * first or last day of them. Throws a RangeError for NaN.
 */
export function isoDate(number: number): string {
  if (Number.isNaN(number)) throw new RangeError('Not a number of days.');
  const shifted = Math.min(Math.max(Math.floor(number), FIRST), LAST) + 719_468;
  const era = Math.floor(shifted / DAYS_IN_400_YEARS);
  const dayOfEra = shifted - era * DAYS_IN_400_YEARS;
  const yearOfEra = Math.floor(
    (dayOfEra -
      Math.floor(dayOfEra / 1460) +
      Math.floor(dayOfEra / 36_524) -
      Math.floor(dayOfEra / 146_096)) /
      365,
  );
  const dayOfYear = dayOfEra - (365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100));
  const marchMonth = Math.floor((5 * dayOfYear + 2) / 153);
  const day = dayOfYear - Math.floor((153 * marchMonth + 2) / 5) + 1;
  const month = marchMonth < 10 ? marchMonth + 3 : marchMonth - 9;
  const year = yearOfEra + era * 400 + (month <= 2 ? 1 : 0);
  return `${String(year).padStart(4, '0')}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
}

/** Day of the week: 1 = Monday … 7 = Sunday. */
export function weekday(number: number): number {
  return ((((number + 3) % 7) + 7) % 7) + 1;
}
