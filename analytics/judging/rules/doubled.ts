import { doubledOf } from './duplicate';
import type { Rule } from './rule';

/** The same pull written down twice; the later ticket carries the flag. */
export const doubled: Rule = ({ record, neighbours }) => {
  const found = doubledOf(neighbours, record);
  return (
    found && {
      rule: 'duplicate',
      certainty: found.certainty,
      expectedMassKg: 0,
      evidence: {
        ofRef: found.of.recordRef,
        recoveredOn: record.recoveredOn,
        recoveredMassKg: record.recoveredMassKg,
      },
    }
  );
};
