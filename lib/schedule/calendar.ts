import { dayNumber, isoDate, weekday } from './day-number';
import { TOLERANCE } from './tolerance';

/** The days on which a project works. */
export interface WorkCalendar {
  /** 1 = Monday … 7 = Sunday; at least one. */
  readonly workingDays: readonly number[];
  /** ISO dates (YYYY-MM-DD) on which no work is done; those on days that are free anyway do no harm. */
  readonly holidays: readonly string[];
}

export const DEFAULT_CALENDAR: WorkCalendar = { workingDays: [1, 2, 3, 4, 5], holidays: [] };

/*
 * Time is counted in working days from time 0, the beginning of the project's first working day: the start
 * date, or the first working day after it. Day k (from 0) is the time from k to k + 1.
 */

/**
 * Working days from the start through the end of `date`: the x of "by date D". 0 before the first working day.
 * `start` and `date` are ISO dates; throws a RangeError where one is not, or where the week has no working day.
 */
export function workingDaysThrough(calendar: WorkCalendar, start: string, date: string): number {
  const ranks = ranksOf(calendar);
  return Math.max(0, rankOf(ranks, dayNumber(date) + 1) - rankOf(ranks, dayNumber(start)));
}

/** The working day in which something that starts at time `t` begins; t = 5 is the sixth working day. */
export function dateOfStart(calendar: WorkCalendar, start: string, t: number): string {
  const ranks = ranksOf(calendar);
  return dateOf(ranks, rankOf(ranks, dayNumber(start)) + Math.floor(t + TOLERANCE));
}

/** The working day in which time `t` ends; t = 5 is the fifth working day, t = 0 the first. */
export function dateOfFinish(calendar: WorkCalendar, start: string, t: number): string {
  const ranks = ranksOf(calendar);
  const day = Math.abs(t) <= TOLERANCE ? 0 : Math.ceil(t - TOLERANCE) - 1;
  return dateOf(ranks, rankOf(ranks, dayNumber(start)) + day);
}

/**
 * First and last working day of an activity from its start and finish times. One that takes no time has a
 * single date, the day at whose end it falls: a milestone after five days stands on the fifth.
 */
export function datesOf(
  calendar: WorkCalendar,
  start: string,
  startTime: number,
  finishTime: number,
): { readonly start: string; readonly finish: string } {
  const finish = dateOfFinish(calendar, start, finishTime);
  return finishTime - startTime <= TOLERANCE
    ? { start: finish, finish }
    : { start: dateOfStart(calendar, start, startTime), finish };
}

/**
 * Working days are numbered through all time (their rank), so that dates become ranks and ranks dates by
 * arithmetic on whole weeks and one binary search among the holidays: no walk from day to day.
 */
interface Ranks {
  /** Working weekdays in order, 0 = Monday. */
  readonly weekdays: readonly number[];
  /** Working weekdays before each weekday. */
  readonly before: readonly number[];
  /** Ranks, by the week alone, of the holidays that fall on working weekdays; ascending, each once. */
  readonly holidays: readonly number[];
  /** holidays[k] − k: the rank, holidays left out, at which holiday k is passed. Never falls. */
  readonly passed: readonly number[];
}

const prepared = new WeakMap<WorkCalendar, Ranks>();

function ranksOf(calendar: WorkCalendar): Ranks {
  let ranks = prepared.get(calendar);
  if (!ranks) {
    ranks = prepare(calendar);
    prepared.set(calendar, ranks);
  }
  return ranks;
}

function prepare(calendar: WorkCalendar): Ranks {
  const weekdays = [0, 1, 2, 3, 4, 5, 6].filter((day) => calendar.workingDays.includes(day + 1));
  if (weekdays.length === 0) throw new RangeError('A week needs a working day.');
  const before = [0, 1, 2, 3, 4, 5, 6].map((day) => weekdays.filter((working) => working < day).length);
  const working = calendar.holidays
    .map(dayNumber)
    .filter((day) => calendar.workingDays.includes(weekday(day)))
    .map((day) => weekRank(weekdays, before, day));
  const holidays = [...new Set(working)].sort((a, b) => a - b);
  return { weekdays, before, holidays, passed: holidays.map((rank, k) => rank - k) };
}

/** Working weekdays before a day, holidays not taken out. Day −3 was a Monday. */
function weekRank(weekdays: readonly number[], before: readonly number[], day: number): number {
  const week = Math.floor((day + 3) / 7);
  return week * weekdays.length + (before[day + 3 - week * 7] ?? 0);
}

/** Working days before a day: the rank of the first working day on or after it. */
function rankOf(ranks: Ranks, day: number): number {
  const rank = weekRank(ranks.weekdays, ranks.before, day);
  return rank - countBelow(ranks.holidays, rank);
}

/** Date of the working day of that rank. */
function dateOf(ranks: Ranks, rank: number): string {
  const { weekdays, passed } = ranks;
  const inWeeks = rank + countBelow(passed, rank + 1);
  const week = Math.floor(inWeeks / weekdays.length);
  const day = weekdays[inWeeks - week * weekdays.length] ?? 0;
  return isoDate(Number.isFinite(rank) ? week * 7 - 3 + day : rank);
}

/** How many of the ascending numbers lie below the limit. */
function countBelow(ascending: readonly number[], limit: number): number {
  let low = 0;
  let high = ascending.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((ascending[middle] ?? Infinity) < limit) low = middle + 1;
    else high = middle;
  }
  return low;
}
