import { toWorkbook } from '@/db/seed/files';
import { heading, work, type DemoList } from '@/db/seed/scenario/row';

/** Five defects, each with a fix: a loop, an unknown predecessor, two estimates out of order, a second bearer of an ID. */
const slipway: DemoList = {
  title: 'Slipway renewal',
  subtitle: 'first issue',
  sheet: 'Works',
  header: ['Activity', 'Description', 'a (d)', 'm (d)', 'b (d)', 'After'],
  rows: [
    heading(null, 'Ashore'),
    work('K1', 'Set out', [1, 2, 4]),
    work('K2', 'Break out old rails', [4, 6, 11], 'K1'),
    work('K3', 'Pour beams', [5, 8, 13], 'K2, K5'),
    work('K4', 'Lay rails', [9, 6, 14], 'K3'),
    work('K5', 'Grout rails', [2, 3, 6], 'K4'),
    heading(null, 'Afloat'),
    work('K6', 'Make cradle', [10, 14, 23], 'K1'),
    work('K6', 'Paint cradle', [2, 3, 5], 'K1'),
    work('K7', 'Float cradle in', [1, 2, 3], 'K5, K6'),
    work('K8', 'Trial haul', [2, 4, 3], 'K7, K0'),
  ],
  foot: [],
};

export async function slipwayFile(name = 'slipway.xlsx') {
  return {
    name,
    mimeType: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
    buffer: Buffer.from(await toWorkbook(slipway)),
  };
}

export const text = (name: string, content: string | Buffer) => ({
  name,
  mimeType: 'application/octet-stream',
  buffer: Buffer.from(content),
});
