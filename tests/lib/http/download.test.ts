import { describe, expect, it } from 'vitest';
import { attachment } from '@/lib/http/download';

describe('the name of a download', () => {
  it.each([
    ['list.xlsx', 'attachment; filename="list.xlsx"; filename*=UTF-8\'\'list.xlsx'],
    [
      'Bauplan Süd.xlsx',
      'attachment; filename="Bauplan Sud.xlsx"; filename*=UTF-8\'\'Bauplan%20S%C3%BCd.xlsx',
    ],
    ['計画.csv', 'attachment; filename=".csv"; filename*=UTF-8\'\'%E8%A8%88%E7%94%BB.csv'],
    [
      'a"b\\c\r\nx: y.csv',
      'attachment; filename="a_b_cx: y.csv"; filename*=UTF-8\'\'a%22b%5Cc%0D%0Ax%3A%20y.csv',
    ],
    ["it's (1)*.csv", "attachment; filename=\"it's (1)*.csv\"; filename*=UTF-8''it%27s%20%281%29%2A.csv"],
    ['計画', 'attachment; filename="file"; filename*=UTF-8\'\'%E8%A8%88%E7%94%BB'],
    ['half \ud800.csv', 'attachment; filename="half .csv"; filename*=UTF-8\'\'half%20_.csv'],
  ])('%j', (name, header) => {
    expect(attachment(name)).toBe(header);
    expect(new Headers({ 'content-disposition': header }).get('content-disposition')).toBe(header);
  });
});
