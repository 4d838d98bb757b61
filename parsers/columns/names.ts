import type { Field } from '@/lib/schedule/field';
import { ELSEWHERE } from './names-elsewhere';
import { ENGLISH } from './names-english';

/**
 * What columns are called, folded (lower case, no accents), punctuation as blanks, `#` as `no`, units and
 * brackets taken off. The number is how surely a header of that name means the field; a name may stand
 * with several fields, and the cells then decide.
 */
export type NameEntry = readonly [field: Field, sureness: number, names: string];

export const NAMES: readonly NameEntry[] = [...ENGLISH, ...ELSEWHERE];

/** Words by which a longer header is told, tried in this order. */
export const WORDS: readonly NameEntry[] = [
  [
    'predecessors',
    0.9,
    'predecessor|predecessors|preds|pred|preceding|prerequisite|prerequisites|depends|dependency|dependencies|vorganger|predecesseur|predecesseurs|predecesores',
  ],
  ['successors', 0.9, 'successor|successors|succs|succeeding|nachfolger'],
  [
    'optimistic',
    0.9,
    'optimistic|best case|minimum duration|min duration|min dur|optimistisch|optimiste|optimista|min time|minimum time|shortest duration',
  ],
  [
    'pessimistic',
    0.9,
    'pessimistic|worst case|maximum duration|max duration|max dur|pessimistisch|pessimiste|pesimista|max time|maximum time|longest duration',
  ],
  ['likely', 0.9, 'likely|probable|wahrscheinlich|wahrscheinlichste|vraisemblable'],
  ['actualStart', 0.8, 'actual start'],
  ['actualFinish', 0.8, 'actual finish|actual end'],
  ['remaining', 0.8, 'remaining duration|remaining dur'],
  ['totalFloat', 0.8, 'total float|total slack'],
  ['percentComplete', 0.8, 'percent complete|percent done'],
  ['constraintDate', 0.8, 'constraint date'],
  ['constraintKind', 0.8, 'constraint type'],
  ['relation', 0.8, 'relationship|relation|link type'],
  ['lag', 0.8, 'lag'],
  [
    'id',
    0.85,
    'activity id|task id|activity code|activity no|activity number|task no|task number|identifier|unique id',
  ],
  ['name', 0.8, 'activity name|task name|description|bezeichnung|descripcion|descrizione'],
  ['wbs', 0.8, 'wbs'],
  ['duration', 0.8, 'duration|dauer|duree|duracion|durata|duur'],
  ['notes', 0.7, 'remarks|comments|notes'],
];

/** Words that make a column something else, whatever stands beside them. */
export const OTHER_THINGS =
  /\b(?:cost|costs|price|budget|amount|rate|value|effort|labou?r hours?|man ?hours?|man ?days?|manhours|mandays|hours? per|probability|risk|variance|deviation|std|sigma|quantity|qty|unit|units|uom|area|weight|kosten|cout|coste|costo|priority|revision|rev|late start|late finish|latest start|latest finish|free float|ls|lf|ff float|actual duration|baseline duration|at completion)\b/;

/** Headers of one letter or two, which mean the estimates where all of a set are there. */
export const LETTER_SETS: readonly (readonly [optimistic: string, likely: string, pessimistic: string])[] = [
  ['a', 'm', 'b'],
  ['o', 'm', 'p'],
  ['o', 'ml', 'p'],
  ['to', 'tm', 'tp'],
  ['ta', 'tm', 'tb'],
  ['t o', 't m', 't p'],
  ['t a', 't m', 't b'],
  ['l', 'm', 'h'],
  ['o', 'l', 'p'],
  ['o', 'n', 'p'],
  ['o', 'r', 'p'],
  ['b', 'm', 'w'],
  ['b', 'ml', 'w'],
];
