/** What came of a part of the tests. `fault` is a sentence for the person when the part itself went wrong. */
export type Tally = { passed: number; failed: number; fault?: string };

/** A part that could not be run counts as one failure. */
export const notRun = (fault: string): Tally => ({ passed: 0, failed: 1, fault });

/** One check that is right or wrong as a whole. */
export const oneCheck = (code: number, output: string): Tally =>
  code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1, fault: output };

/**
 * The tally of a runner that counted for itself: tests that were left out count as failed, and so does a runner that
 * ended badly though no test failed, or that found no test.
 */
export const counted = (passed: number, failed: number, leftOut: number, code: number): Tally => {
  if (failed === 0 && leftOut > 0) return { passed, failed: leftOut, fault: `${leftOut} tests were left out.` };
  if (failed + leftOut > 0) return { passed, failed: failed + leftOut };
  if (code !== 0) return { passed, failed: 1, fault: `The runner ended with code ${code} though no test failed.` };
  return passed > 0 ? { passed, failed } : notRun('There was no test to run.');
};
