import type { PulledRecord } from '@/analytics/leak-suspicion/visits';
import { massToKg, vacuumToKpaAbs } from '@/lib/units';
import { MASS_UNITS, VACUUM_UNITS } from '@/lib/vocabulary';
import type { Ticket } from '@/seed/ticket';

/** Tickets as the suspicion reads records; those without masses are left out, as the import refuses them. */
export const pulledRecords = (tickets: readonly Ticket[]): PulledRecord[] =>
  tickets.flatMap((ticket) => {
    const unit = MASS_UNITS.find((known) => known === ticket.mass_unit) ?? 'lb';
    const kg = (text: string | undefined) => Number(massToKg(text ?? '', unit) ?? Number.NaN);
    const recoveredMassKg = ticket.recovered_mass
      ? kg(ticket.recovered_mass)
      : kg(ticket.end_weight) - kg(ticket.start_weight);
    const fullChargeKg = kg(ticket.nameplate_charge) + kg(ticket.added_charge || '0');
    if (!(fullChargeKg > 0) || !Number.isFinite(recoveredMassKg)) return [];
    const gauge = VACUUM_UNITS.find((known) => known === ticket.vacuum_unit);
    return [
      {
        applianceId: `${ticket.site} / ${ticket.appliance}`,
        recoveredOn: (ticket.recovered_at ?? '').slice(0, 10),
        recoveredMassKg,
        fullChargeKg,
        category: ticket.appliance_category ?? '',
        jobType: ticket.job_type ?? '',
        refrigerant: ticket.refrigerant ?? '',
        finalVacuumKpaAbs: ticket.final_vacuum && gauge ? vacuumToKpaAbs(Number(ticket.final_vacuum), gauge) : null,
        decision: null,
        judgedShort: null,
        judgedStopped: null,
      },
    ];
  });
