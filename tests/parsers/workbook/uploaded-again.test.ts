import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { toCsv, toWorkbook } from '@/db/seed/files';
import { pumpingStation } from '@/db/seed/scenario/pumping-station';
import { telemetryRev0 } from '@/db/seed/scenario/telemetry';
import { runAudit } from '@/lib/audit';
import { applyCorrections, composeAdoption } from '@/lib/corrections';
import { detectMatching, readActivityList, readSheets } from '@/parsers';
import { giveBack } from '@/parsers/workbook';

function audit(bytes: Uint8Array, name: string) {
  const sheets = readSheets(bytes, name);
  const { matching, proposed } = detectMatching(sheets);
  return { sheets, matching, proposed, findings: runAudit(readActivityList(sheets, matching)) };
}

const files: [string, () => Uint8Array | Promise<Uint8Array>][] = [
  ['north-mole.xlsx', () => new Uint8Array(readFileSync('fixtures/uploads/workbooks/office-rich.xlsx'))],
  ['pumping-station.xlsx', () => toWorkbook(pumpingStation)],
  ['pumping-station.csv', () => toCsv(pumpingStation)],
  ['telemetry.xlsx', () => toWorkbook(telemetryRev0)],
];

describe('a corrected file uploaded again', () => {
  it.each(files)('%s has none of the findings that were corrected, and no others', async (name, make) => {
    const bytes = await make();
    const before = audit(bytes, name);
    const fixes = before.findings.flatMap(({ key, fix }) => (fix ? [{ id: key, edits: fix.edits }] : []));
    const { adopted } = composeAdoption(before.sheets, fixes);
    expect(adopted.length).toBeGreaterThan(0);

    const given = giveBack({ bytes, fileName: name, corrections: adopted, changes: [] });
    expect(given.check.found).toBe(adopted.length);
    const after = audit(given.bytes, name);
    expect(after.proposed).toBe(before.proposed);
    const corrected = readActivityList(applyCorrections(before.sheets, adopted), before.matching);
    const keys = (findings: typeof after.findings) => findings.map(({ key }) => key).sort();
    expect(keys(after.findings)).toEqual(keys(runAudit(corrected)));
    expect(after.findings.length).toBeLessThan(before.findings.length);
  });
});
