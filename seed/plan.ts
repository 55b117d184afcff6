import { BRANCHES, COMPANY_NAME, SMALL_BRANCHES, SMALL_COMPANY_NAME } from './names';

/** What company to make up. The same plan gives the same rows. */
export type Plan = {
  seed: string;
  company: string;
  branches: readonly string[];
  /** Last month of records, `YYYY-MM`. */
  endMonth: string;
  /** Twelve or more. */
  months: number;
  technicians: number;
  sites: number;
  /** Share of the places for equipment and of the work in `EQUIPMENT`. */
  scale: number;
};

/** How the work is spread over the branches. */
export const BRANCH_SHARES = [0.45, 0.32, 0.23];

/** Ten years of a contractor with three branches. */
export const demoPlan = (endMonth: string): Plan => ({
  seed: 'yellow shoulder, grey body',
  company: COMPANY_NAME,
  branches: BRANCHES,
  endMonth,
  months: 120,
  technicians: 30,
  sites: 400,
  scale: 1,
});

/** One year of a small neighbour, for the person who works in two companies. */
export const smallPlan = (endMonth: string): Plan => ({
  seed: 'a heel of two pounds',
  company: SMALL_COMPANY_NAME,
  branches: SMALL_BRANCHES,
  endMonth,
  months: 12,
  technicians: 4,
  sites: 30,
  scale: 0.12,
});
