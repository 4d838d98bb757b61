import { readdirSync, readFileSync } from 'node:fs';
import { generateDrizzleJson, generateMigration } from 'drizzle-kit/api';
import { expect, it } from 'vitest';
import * as schema from '@/db/schema';

type Snapshot = ReturnType<typeof generateDrizzleJson>;

it('the migrations lead to the schema as it is written: none was forgotten', async () => {
  const last = readdirSync('drizzle/meta')
    .filter((name) => name.endsWith('_snapshot.json'))
    .sort()
    .at(-1);
  const snapshot = JSON.parse(readFileSync(`drizzle/meta/${last}`, 'utf8')) as Snapshot;
  expect(await generateMigration(snapshot, generateDrizzleJson(schema, snapshot.id))).toEqual([]);
});
