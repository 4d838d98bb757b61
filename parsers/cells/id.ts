import { type CellValue, ErrorValue } from '@/lib/schedule/sheet';
import { asShown } from './number-format';
import { clean } from './text';

const WITH_ZERO_DECIMALS = /^(\d+)\.0+$/;

/** An ID as it is compared: without blanks around it, `7.0` written `7`. */
export function normalId(text: string): string {
  const cleaned = clean(text);
  return WITH_ZERO_DECIMALS.exec(cleaned)?.[1] ?? cleaned;
}

/** The ID in a cell; a number as its format shows it. '' where there is none. */
export function readId(value: CellValue, format: string, date1904: boolean): string {
  return normalId(readText(value, format, date1904));
}

/** A cell's text as the sheet shows it; '' where it is empty or shows an error. */
export function readText(value: CellValue | undefined, format: string, date1904: boolean): string {
  if (value === null || value === undefined || value instanceof ErrorValue) return '';
  if (typeof value === 'string') return value;
  return typeof value === 'number' ? asShown(value, format, date1904) : value ? 'TRUE' : 'FALSE';
}
