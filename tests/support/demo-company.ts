import { makeCompany } from '@/seed/company';
import { demoPlan } from '@/seed/plan';
import type { Ticket } from '@/seed/ticket';

/** The large demo company as it is made for one fixed end. */
export const DEMO = makeCompany(demoPlan('2026-11'));

export const monthOf = ({ recovered_at = '' }: Ticket): string => recovered_at.slice(0, 7);
export const yearOf = ({ recovered_at = '' }: Ticket): number => Number(recovered_at.slice(0, 4));

/** Share of the tickets for which it holds; NaN for none. */
export const share = (tickets: readonly Ticket[], holds: (ticket: Ticket) => boolean): number =>
  tickets.filter(holds).length / tickets.length;

/** Recovered over full charge as the ticket says it, NaN where the net is not written or in pounds and ounces. */
export const yieldOf = ({ recovered_mass, nameplate_charge, added_charge }: Ticket): number =>
  recovered_mass ? Number(recovered_mass) / (Number(nameplate_charge) + Number(added_charge || 0)) : Number.NaN;

export const median = (values: readonly number[]): number => {
  const sorted = values.filter((v) => !Number.isNaN(v)).sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
};
