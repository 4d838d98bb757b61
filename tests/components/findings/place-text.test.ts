import { expect, it } from 'vitest';
import { aboutText, haveSeveralSheets, placeText } from '@/components/findings/place-text';
import { finding } from '@/tests/support/findings';

it('names the cell, else the row, else the whole list', () => {
  expect(placeText(finding(23), false)).toBe('G23');
  expect(placeText(finding(23, { cell: null }), false)).toBe('row 23');
  expect(placeText(finding(23, { cell: null, row: null, sheet: null }), false)).toBe('whole list');
});

it('adds the sheet where there are several', () => {
  expect(placeText(finding(23), true)).toBe('Works, G23');
  expect(haveSeveralSheets([finding(1), finding(2, { sheet: null })])).toBe(false);
  expect(haveSeveralSheets([finding(1, { sheet: null }), finding(2), finding(3, { sheet: 'East' })])).toBe(
    true,
  );
});

it('says what it is about', () => {
  expect(aboutText(finding(140))).toBe('D-140 Drive piles, east');
  expect(aboutText(finding(1, { activityName: null }))).toBe('D-1');
  expect(aboutText(finding(1, { activityId: null, activityName: null }))).toBe('–');
});
