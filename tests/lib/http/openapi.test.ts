import { describe, expect, it } from 'vitest';
import { openApiDocument } from '@/lib/http/openapi/document';
import { METHODS } from '@/lib/http/openapi/operation';
import { OPERATIONS } from '@/lib/http/openapi/operations';
import { loadRoute, routePaths } from '@/tests/support/http';

/** Served by next-auth, whose surface is its own; and what answers where nothing else does. */
const OTHERS = ['/api/auth/[...nextauth]', '/api/[...unknown]'];

const served = routePaths.filter((path) => !OTHERS.includes(path));
const document = openApiDocument();

describe('the document', () => {
  it('tells of every path that is served, and of no other', () => {
    expect(Object.keys(document.paths ?? {}).sort()).toEqual(served);
  });

  it.each(served)('tells of every method of %s, and of no other', async (path) => {
    const handlers = Object.keys(await loadRoute(path)).filter((name) => name === name.toUpperCase());
    const told = METHODS.filter((method) => document.paths?.[path]?.[method]);
    expect(told.map((method) => method.toUpperCase()).sort()).toEqual(handlers.sort());
  });

  it('names each operation once', () => {
    const ids = OPERATIONS.map((operation) => operation.id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('says for each what is answered, and which problems there are', () => {
    for (const { path, method, status = 200, open } of OPERATIONS) {
      const answers = document.paths?.[path]?.[method]?.responses ?? {};
      expect(Object.keys(answers)).toContain(String(status));
      if (!open) expect(Object.keys(answers)).toContain('401');
    }
  });

  it('gives each path parameter', () => {
    for (const { path, method } of OPERATIONS) {
      const named = [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1]);
      const parameters = document.paths?.[path]?.[method]?.parameters ?? [];
      const told = parameters.flatMap((each) => ('in' in each && each.in === 'path' ? [each.name] : []));
      expect(told).toEqual(named);
    }
  });

  it('uses the components it defines, and defines those it uses', () => {
    const text = JSON.stringify(document.paths);
    const used = new Set([...text.matchAll(/#\/components\/schemas\/(\w+)/g)].map((match) => match[1]));
    for (const name of used) expect(document.components?.schemas).toHaveProperty(String(name));
    for (const name of ['Problem', 'Submission', 'Finding', 'Project']) expect(used).toContain(name);
  });
});
