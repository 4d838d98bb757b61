const DAY_MS = 86_400_000;
/** Day 0 of the 1900 system as it counts from 1 March 1900 on, past the 29 February that never was; and of the 1904 system. */
const EPOCH_1900 = Date.UTC(1899, 11, 30);
const EPOCH_1904 = Date.UTC(1904, 0, 1);
const FIRST_OF_MARCH = 61;

/** Serial number of an ISO 8601 date or time of day; null where the text is neither. */
export function isoToSerial(text: string, date1904: boolean): number | null {
  const time = /^T?(\d\d):(\d\d)(?::(\d\d(?:\.\d+)?))?Z?$/.exec(text);
  if (time) return (Number(time[1]) + Number(time[2]) / 60 + Number(time[3] ?? 0) / 3600) / 24;
  if (!/^\d{4}-\d\d-\d\d(T\d\d:\d\d(:\d\d(\.\d+)?)?Z?)?$/.test(text)) return null;
  const ms = Date.parse(text.endsWith('Z') || !text.includes('T') ? text : `${text}Z`);
  if (Number.isNaN(ms)) return null;
  return (ms - (date1904 ? EPOCH_1904 : EPOCH_1900)) / DAY_MS;
}

/** Calendar date (YYYY-MM-DD) of a serial number; null where it names none. */
export function serialToIso(serial: number, date1904: boolean): string | null {
  const day = Math.floor(serial);
  if (!date1904 && day === 60) return null;
  // Before 1 March 1900 the 1900 system is a day behind, since it counts that 29 February.
  const shift = !date1904 && day < FIRST_OF_MARCH ? 1 : 0;
  const ms = (date1904 ? EPOCH_1904 : EPOCH_1900) + (day + shift) * DAY_MS;
  if (!(day >= 0 && ms < Date.UTC(10_000, 0, 1))) return null;
  return new Date(ms).toISOString().slice(0, 10);
}
