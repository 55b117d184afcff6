/**
 * Where the comparison of technicians draws its lines. Told on the page of methods; chosen on invented companies other
 * than those by which it is measured (`npm run bench -- technicians`).
 */
export const COMPARISON_SETTINGS = {
  /** Share of false ones that is borne among those who are called below or above. */
  falseDiscoveryRate: 0.02,
  /** The same among those at whom only the trainer is asked to look. */
  lookRate: 0.1,
  /** Chance by which the final vacuum must bear out what the yield says. */
  vacuumBearsOut: 0.05,
  /** Smaller differences are nobody's fault: as a share of the full charge. */
  leastEffect: 0.02,
  /** Share of early stops beyond the usual that is worth a word. */
  leastEarlyExcess: 0.04,
  /** Technicians below whom nothing is known of how sound people differ. */
  leastTechnicians: 5,
  /** Spread of sound technicians before the crew tells: as a part of the spread of one's own full pulls. */
  usualYieldSpread: 0.4,
  usualVacuumSpread: 0.25,
  /** Final vacuums without which a technician is judged by his yields alone. */
  leastVacuums: 20,
  /** Share of his jobs that must tell one. */
  leastVacuumShare: 0.5,
} as const;
