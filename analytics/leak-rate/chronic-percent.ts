/** From so many percent of its full charge in a calendar year an appliance is a chronic leaker: 40 CFR 82.157(j). */
export const CHRONIC_PERCENT = 125;
