const NAMED: Readonly<Record<string, string>> = { amp: '&', lt: '<', gt: '>', quot: '"', apos: "'" };

/**
 * Text of an XML part from start to end, references resolved; null where it holds a reference that XML does
 * not know.
 */
export function decodeText(bytes: Buffer, start: number, end: number): string | null {
  let plain = true;
  let marked = false;
  for (let at = start; at < end; at++) {
    const byte = bytes[at] ?? 0;
    if (byte > 127) plain = false;
    else if (byte === 38 || byte === 13) marked = true; // & and carriage return
  }
  const text = plain ? bytes.toString('latin1', start, end) : bytes.toString('utf8', start, end);
  return marked ? resolveReferences(text) : text;
}

function resolveReferences(text: string): string | null {
  let unknown = false;
  const resolved = text.replace(/\r\n?/g, '\n').replace(/&([^;&]*);?/g, (whole, name: string) => {
    const character = whole.endsWith(';') ? reference(name) : null;
    if (character === null) unknown = true;
    return character ?? whole;
  });
  return unknown ? null : resolved;
}

function reference(name: string): string | null {
  const numbered = /^#(?:x([0-9a-fA-F]{1,6})|(\d{1,7}))$/.exec(name);
  if (!numbered) return NAMED[name] ?? null;
  const code = numbered[1] ? Number.parseInt(numbered[1], 16) : Number(numbered[2]);
  const isCharacter = code === 9 || code === 10 || code === 13 || (code >= 32 && code <= 0x10ffff);
  return isCharacter && !(code >= 0xd800 && code <= 0xdfff) ? String.fromCodePoint(code) : null;
}

/** Resolves the _xHHHH_ escapes of cell texts (ECMA-376 part 1, 22.9.2.19). */
export function unescapeText(text: string): string {
  if (!text.includes('_x')) return text;
  return text.replace(/_x([0-9A-Fa-f]{4})_/g, (_, code: string) =>
    String.fromCharCode(Number.parseInt(code, 16)),
  );
}
