import { readXml } from './xml';

/** Format codes that a workbook names by number alone (ECMA-376 part 1, 18.8.30). */
const BUILT_IN: Readonly<Record<number, string>> = {
  1: '0',
  2: '0.00',
  3: '#,##0',
  4: '#,##0.00',
  9: '0%',
  10: '0.00%',
  11: '0.00E+00',
  12: '# ?/?',
  13: '# ??/??',
  14: 'm/d/yyyy',
  15: 'd-mmm-yy',
  16: 'd-mmm',
  17: 'mmm-yy',
  18: 'h:mm AM/PM',
  19: 'h:mm:ss AM/PM',
  20: 'h:mm',
  21: 'h:mm:ss',
  22: 'm/d/yy h:mm',
  37: '#,##0;(#,##0)',
  38: '#,##0;[Red](#,##0)',
  39: '#,##0.00;(#,##0.00)',
  40: '#,##0.00;[Red](#,##0.00)',
  45: 'mm:ss',
  46: '[h]:mm:ss',
  47: 'mm:ss.0',
  48: '##0.0E+0',
  49: '@',
};
/** Dates whose form depends on the language (ids 27–36 and 50–58). */
const LOCAL_DATE = 'yyyy/m/d';
const ISO_DATE = 'yyyy-mm-dd';

/** The number formats of a workbook: which style has which, and the codes. */
export class NumberFormats {
  /** Index 0 is General. */
  readonly codes: string[] = ['General'];
  private readonly indexOfCode = new Map<string, number>([['General', 0]]);
  /** By style index (cellXfs). */
  private readonly byStyle: number[] = [];

  static read(bytes: Uint8Array | null, part: string): NumberFormats {
    const formats = new NumberFormats();
    if (!bytes) return formats;
    const own = new Map<string, string>();
    let inStyles = false;
    readXml(bytes, part, {
      open(element, { numFmtId = '0', formatCode }) {
        if (element === 'numFmt' && formatCode !== undefined) own.set(numFmtId, formatCode);
        else if (element === 'cellXfs') inStyles = true;
        else if (element === 'xf' && inStyles) {
          formats.byStyle.push(formats.indexOf(own.get(numFmtId) ?? builtIn(Number(numFmtId))));
        }
      },
      close(element) {
        if (element === 'cellXfs') inStyles = false;
      },
    });
    return formats;
  }

  /** Index of a style's format; 0 where it is General. */
  ofStyle(style: number): number {
    return this.byStyle[style] ?? 0;
  }

  get isoDate(): number {
    return this.indexOf(ISO_DATE);
  }

  private indexOf(code: string): number {
    const known = this.indexOfCode.get(code);
    if (known !== undefined) return known;
    this.codes.push(code);
    this.indexOfCode.set(code, this.codes.length - 1);
    return this.codes.length - 1;
  }
}

function builtIn(id: number): string {
  if ((id >= 27 && id <= 36) || (id >= 50 && id <= 58)) return LOCAL_DATE;
  return BUILT_IN[id] ?? 'General';
}
