import { expect, test } from 'vitest';
import { clashesOf, rebased } from '@/components/records/conflict';
import { changedFields } from '@/components/records/write';
import { emptyTexts } from '@/lib/recoveries/fields';

const began = emptyTexts({ endWeight: '10', notes: 'old', site: 'A' });
const theirs = { ...began, endWeight: '11', site: 'B' };
const mine = { ...began, endWeight: '12', notes: 'new' };

test('both versions are shown for every field that the other correction changed', () => {
  expect(clashesOf(began, theirs, mine)).toEqual([
    { field: 'site', began: 'A', theirs: 'B', mine: 'A' },
    { field: 'endWeight', began: '10', theirs: '11', mine: '12' },
  ]);
});

test('what was typed stays, what was not touched follows the newer version', () => {
  const next = rebased(began, theirs, mine);
  expect(next).toMatchObject({ endWeight: '12', notes: 'new', site: 'B' });
  expect(changedFields(theirs, next)).toEqual({ endWeight: '12', notes: 'new' });
});
