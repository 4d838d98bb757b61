import type { CellContent } from '@/lib/schedule/sheet';
import { startsLikeFormula } from '../formula-start';

/** How a field was written, or how the file writes its fields. */
export interface FieldStyle {
  readonly quoted: boolean;
  /** As `="007"`, which keeps a text a text when a spreadsheet program opens the file. */
  readonly asText: boolean;
}

/**
 * A field as it stands in the file. A text that a spreadsheet program could take for a formula gets an
 * apostrophe before it (OWASP ASVS 5, 1.2.10), which our reader takes off again; `trusted` tells of texts
 * that the file holds as they are already.
 */
export function writeField(
  content: CellContent,
  delimiter: string,
  style: FieldStyle,
  trusted: (text: string) => boolean = () => false,
): string {
  const text = content === null ? '' : String(content);
  if (style.asText && text !== '' && !text.includes('"')) {
    const held = `="${text}"`;
    return style.quoted || held.includes(delimiter) || /[\r\n]/.test(text) ? quote(held) : held;
  }
  const held = needsGuard(text) && !trusted(text) ? `'${text}` : text;
  return style.quoted || held.includes(delimiter) || /["\r\n]/.test(held) ? quote(held) : held;
}

const quote = (text: string) => `"${text.replaceAll('"', '""')}"`;

/** Our reader takes one apostrophe off before such a text, so one that has its own gets a second. */
const needsGuard = (text: string) => startsLikeFormula(text) || /^'+[=+\-@\t\r\n]/.test(text);
