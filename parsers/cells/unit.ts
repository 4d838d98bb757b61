import type { Unit } from '@/lib/schedule/activity';
import type { ReadingOptions } from '@/lib/schedule/activity-list';
import { fold } from './text';

/** A unit of time as written: one of those that durations are read in, or one that says how many of them. */
export interface WrittenUnit {
  readonly unit: Unit;
  /** How many of the unit one of the written makes: a minute is 1/60 of an hour. */
  readonly times: number;
}

interface UnitWords {
  /** Folded, separated by blanks; an underscore stands for a blank within. */
  readonly words: string;
  /** The ways they could be meant. */
  readonly means: readonly WrittenUnit[];
}

const UNITS: readonly UnitWords[] = [
  {
    words:
      'd dy dys day days wd wds workday workdays work-day work-days work_day work_days working-day working-days ' +
      'working_day working_days bd business_day business_days tag tage tagen arbeitstag arbeitstage arbeitstagen at ' +
      'j jr jrs jour jours jo jour_ouvre jours_ouvres jour_ouvrable jours_ouvrables dia dias dia_habil dias_habiles ' +
      'dag dagen werkdag werkdagen giorno giorni gg giorni_lavorativi',
    means: [{ unit: 'day', times: 1 }],
  },
  {
    words:
      'h hr hrs hour hours working_hour working_hours work_hour work_hours std stunde stunden heure heures hora horas ' +
      'ora ore uur uren',
    means: [{ unit: 'hour', times: 1 }],
  },
  { words: 'minute minutes mins min', means: [{ unit: 'hour', times: 1 / 60 }] },
  {
    words:
      'w wk wks week weeks work_week work_weeks working_week working_weeks workweek workweeks woche wochen semaine ' +
      'semaines sem semana semanas settimana settimane weken',
    means: [{ unit: 'week', times: 1 }],
  },
  // How many working days these have, no convention settles: a cell in such a unit cannot be read.
  {
    words: 'mo mos mth mths month months monat monate mois mes meses maand maanden mese mesi',
    means: [
      { unit: 'week', times: 4 },
      { unit: 'week', times: 52 / 12 },
    ],
  },
  {
    words: 'y yr yrs year years jahr jahre an ans ano anos jaar anno anni',
    means: [
      { unit: 'week', times: 52 },
      { unit: 'week', times: 48 },
    ],
  },
  {
    words:
      'cd calendar_day calendar_days kalendertag kalendertage ed eday edays elapsed_day elapsed_days ' +
      'jours_calendaires dias_naturales',
    means: [
      { unit: 'day', times: 1 },
      { unit: 'week', times: 1 / 7 },
    ],
  },
];

const MEANINGS = new Map(
  UNITS.flatMap(({ words, means }) =>
    words.split(' ').map((word) => [word.replaceAll('_', ' '), means] as const),
  ),
);

/** What a word says of time: a unit, several ways it could be meant, or nothing (null). */
export function readUnit(word: string): readonly WrittenUnit[] | null {
  return (
    MEANINGS.get(
      fold(word)
        .replace(/\.(?=\s|$)/g, '')
        .trim(),
    ) ?? null
  );
}

/** The only way a word can be meant as a unit; null where there is none, or several. */
export function oneUnit(word: string): WrittenUnit | null {
  const units = readUnit(word);
  return units?.length === 1 ? (units[0] ?? null) : null;
}

/** Working days in one of a unit. */
export function daysIn(unit: Unit, { hoursPerDay, daysPerWeek }: ReadingOptions): number {
  return unit === 'day' ? 1 : unit === 'week' ? daysPerWeek : 1 / hoursPerDay;
}
