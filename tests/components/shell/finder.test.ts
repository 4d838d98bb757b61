import { describe, expect, it } from 'vitest';
import { findTargets, type Target } from '@/components/shell/finder';

const target = (kind: Target['kind'], label: string, code = ''): Target => ({
  key: label,
  label,
  code,
  kind,
  href: '/',
});
const TARGETS = [
  target('place', 'Desk'),
  target('project', 'Ferry landing renewal', 'SHT-014'),
  target('activity', 'Drive piles, east', 'D-14'),
  target('activity', 'Côte d’Opale survey', 'D-140'),
  target('rule', 'A loop of activities', 'loop'),
];
const labels = (query: string, limit?: number) =>
  findTargets(TARGETS, query, limit).map(({ label }) => label);

describe('findTargets', () => {
  it('offers the places and the projects before anything is typed', () => {
    expect(labels('  ')).toEqual(['Desk', 'Ferry landing renewal']);
  });

  it('puts the very code first, then what begins so', () => {
    expect(labels('d-14')).toEqual(['Drive piles, east', 'Côte d’Opale survey']);
    expect(labels('D-140')).toEqual(['Côte d’Opale survey']);
  });

  it('prefers a word’s beginning to its inside', () => {
    expect(labels('l')).toEqual([
      'A loop of activities',
      'Ferry landing renewal',
      'Drive piles, east',
      'Côte d’Opale survey',
    ]);
  });

  it('does without case and accents', () => {
    expect(labels('COTE')).toEqual(['Côte d’Opale survey']);
  });

  it('finds nothing for what is not there, and no more than asked', () => {
    expect(labels('zzz')).toEqual([]);
    expect(labels('e', 2)).toHaveLength(2);
  });
});
