import type { CellContent, CellValue } from '@/lib/schedule/sheet';
import { ErrorValue } from '@/lib/schedule/sheet';

const INVISIBLE = /[\u00ad\u200b-\u200f\u2060\ufeff]/g;
const BLANKS = /[\s\u00a0\u2000-\u200a\u202f\u205f\u3000]+/g;
const HYPHENS = /[\u2010\u2011]/g;
const IS_CLEAN = /^(?:[\x21-\x7e]+(?: [\x21-\x7e]+)*)?$/;

/** The text without blanks around it and invisible characters, every run of blanks one space. */
export function clean(text: string): string {
  if (IS_CLEAN.test(text)) return text;
  return text.replace(INVISIBLE, '').replace(BLANKS, ' ').replace(HYPHENS, '-').trim();
}

/** Whether a cell holds nothing that can be seen. */
export function isBlank(value: CellValue | undefined): boolean {
  return value === null || value === undefined || (typeof value === 'string' && clean(value) === '');
}

/** What the cell holds, as a correction says it. */
export function toContent(value: CellValue | undefined): CellContent {
  if (value === null || value === undefined || typeof value === 'number') return value ?? null;
  if (typeof value === 'string') return value;
  return value instanceof ErrorValue ? value.code : value ? 'TRUE' : 'FALSE';
}

/** Lower case, without accents; for comparing words. */
export function fold(text: string): string {
  return clean(text)
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase();
}
