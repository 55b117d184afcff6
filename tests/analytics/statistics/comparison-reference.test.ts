import { effectChecks } from './comparison/effect-checks';
import { funnelChecks } from './comparison/funnel-checks';
import { regressionChecks } from './comparison/regression-checks';
import { technicianChecks } from './comparison/technician-checks';
import { testChecks } from './comparison/test-checks';
import { checkReference } from './reference';

// Closed forms; what is found by iteration states its own tolerance.
checkReference(
  'comparison',
  { relative: 1e-9 },
  { ...funnelChecks, ...effectChecks, ...testChecks, ...regressionChecks, ...technicianChecks },
);
