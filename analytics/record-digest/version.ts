/** Raised whenever suspicion or comparison are worked out otherwise: every company's digest is then made anew. */
export const DIGEST_VERSION = 1;
