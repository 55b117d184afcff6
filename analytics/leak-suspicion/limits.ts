/** The settings of the suspicion, in one place. The browser reads this too: no imports. */

/** Visits of these last months speak: a leak that was mended years ago is no suspicion. */
export const VISIT_MONTHS = 36;
/** Nothing is said of an appliance from fewer visits. */
export const LEAST_VISITS = 3;
/** Nor unless it came short at so many of them: one short visit is no pattern. */
export const LEAST_SHORT_VISITS = 2;
/** A visit counts as short from this probability on. */
export const SHORT_FROM = 0.5;
/** An appliance is listed as suspected from this probability on. */
export const SUSPECTED_FROM = 0.8;
/** Like jobs that are needed to say what is usual. */
export const LEAST_LIKE_VISITS = 20;
/** Share of false ones that is borne among the sites pointed out. */
export const FALSE_SITES = 0.1;
