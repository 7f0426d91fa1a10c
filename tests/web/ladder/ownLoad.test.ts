import { expect, test } from 'vitest';
import { ownLoad } from '../../../web/ladder/ownLoad.ts';

test('a tie force stands as all forces do, what it is held by rounded down', () => {
  expect(ownLoad({ demand: 75, resistance: 238.46, unit: 'kN' }, 'kN')).toEqual({ demand: '75', resistance: '238.4' });
});

test('a weld leg in inches keeps its thousandths', () => {
  expect(ownLoad({ demand: 0.2344, resistance: 0.25, unit: 'in' }, 'kip')).toEqual({
    demand: '0.234',
    resistance: '0.25',
  });
});

test('without a number a dash stands', () => {
  expect(ownLoad({ demand: null, resistance: null, unit: '' }, 'kN')).toEqual({ demand: '0', resistance: '–' });
});
