/** Asks for a new digest of the company's records ($1) as part of the transaction; many asking meanwhile are one. */
export const REQUEST_DIGEST = `
  select work.enqueue('digest-records', json_build_object('companyId', $1::text), 'digest-records:' || $1::text)`;
