import { expect, test } from 'vitest';
import { safeNextPath } from '@/lib/auth/next-path';

test('a path of this site is kept with its search', () => {
  expect(safeNextPath('/trends?refrigerant=R-22#chart')).toBe('/trends?refrigerant=R-22#chart');
});

// Forms of OWASP's Unvalidated Redirects and Forwards Cheat Sheet and of the WHATWG URL parser, which takes a backslash
// for a slash and drops tabs.
test.each([
  'https://elsewhere.example',
  '//elsewhere.example',
  '/\\elsewhere.example',
  '/\t/elsewhere.example',
  'trends',
  '',
  null,
  undefined,
])('%j leads to the start', (next) => {
  expect(safeNextPath(next)).toBe('/');
});
