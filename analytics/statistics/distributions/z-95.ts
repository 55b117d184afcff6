/** The standard normal quantile at 97.5 %: half-width of a 95 % interval in standard errors. */
export const Z_95 = 1.959963984540054;
