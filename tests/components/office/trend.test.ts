import { describe, expect, it } from 'vitest';
import { axisMarks, movement } from '@/components/office/trend';

describe('movement', () => {
  it('runs from the first to the last revision that has a figure', () => {
    const points = [
      { revision: 0, value: null },
      { revision: 1, value: 115 },
      { revision: 2, value: 112 },
      { revision: 3, value: null },
    ];
    expect(movement(points)).toMatchObject({ from: { revision: 1 }, to: { revision: 2 }, by: -3 });
  });

  it('needs two', () => {
    expect(movement([{ revision: 0, value: 3 }])).toBeNull();
    expect(movement([])).toBeNull();
  });
});

describe('axisMarks', () => {
  it('encloses the values with round steps', () => {
    expect(axisMarks([0, 17, 14])).toEqual([0, 10, 20]);
    expect(axisMarks([115, 118])).toEqual([115, 116, 117, 118]);
  });

  it('has at least two marks where all values are one', () => {
    for (const value of [0, 5, 118.4]) {
      const marks = axisMarks([value]);
      expect(marks.length).toBeGreaterThan(1);
      expect(marks[0]).toBeLessThanOrEqual(value);
      expect(marks.at(-1)).toBeGreaterThanOrEqual(value);
    }
  });
});
