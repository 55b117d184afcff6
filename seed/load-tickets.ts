import { randomUUID } from 'node:crypto';
import { withCompanyJob } from '@/db/client';
import { appliances, branches, cylinders, sites, technicians } from '@/db/schema/places';
import { recoveries } from '@/db/schema/recoveries';
import { massToKg, riseToKpa, vacuumToKpaAbs } from '@/lib/units';
import type {
  ApplianceCategory,
  CertificationType,
  Disposition,
  JobType,
  MassUnit,
  VacuumUnit,
} from '@/lib/vocabulary';
import type { DemoCompany } from './company';
import type { Ticket } from './ticket';
import { refsWith } from './truth';

const CHUNK = 1000;

/** Writes the tickets straight into the tables. */
export const loadTickets = (companyId: string, company: DemoCompany): Promise<void> =>
  withCompanyJob({ companyId, actor: 'demo' }, async (tx) => {
    const ids = async (table: typeof branches | typeof technicians | typeof sites | typeof cylinders) =>
      new Map((await tx.select({ id: table.id, name: table.name }).from(table)).map(({ id, name }) => [name, id]));
    const [branchIds, technicianIds, siteIds, cylinderIds] = [
      await ids(branches),
      await ids(technicians),
      await ids(sites),
      await ids(cylinders),
    ];
    const refused = refsWith(company.truth, 'refused');
    const taken = company.tickets.filter(({ record_ref }) => !refused.has(record_ref));
    const keyOf = ({ site, appliance }: Ticket) => `${site}/${appliance}`;
    const units = new Map(taken.map((ticket) => [keyOf(ticket), { ticket, id: randomUUID() }]));
    const kg = (text: string | undefined, unit: string | undefined) => (text ? massToKg(text, unit as MassUnit) : null);
    await tx.insert(appliances).values(
      [...units.values()].map(({ id, ticket: t }) => ({
        companyId,
        id,
        name: t.appliance ?? '',
        siteId: siteIds.get(t.site ?? '') ?? '',
        category: t.appliance_category as ApplianceCategory,
        refrigerant: t.refrigerant ?? null,
        nameplateChargeKg: kg(t.nameplate_charge, t.mass_unit),
        manufacturedOn: t.manufactured_on || null,
      })),
    );
    const rows = taken.map((t): typeof recoveries.$inferInsert => {
      const [start, end] = [kg(t.start_weight, t.mass_unit), kg(t.end_weight, t.mass_unit)];
      const vacuumUnit = (t.vacuum_unit || null) as VacuumUnit | null;
      return {
        companyId,
        recordRef: t.record_ref,
        recoveredOn: t.recovered_at?.slice(0, 10) ?? '',
        recoveredAt: t.recovered_at?.includes('T') ? t.recovered_at : null,
        technicianId: technicianIds.get(t.technician ?? '') ?? '',
        siteId: siteIds.get(t.site ?? '') ?? '',
        applianceId: units.get(keyOf(t))?.id ?? '',
        branchId: branchIds.get(t.branch ?? '') ?? null,
        category: t.appliance_category as ApplianceCategory,
        jobType: t.job_type as JobType,
        refrigerant: t.refrigerant ?? '',
        nameplateChargeKg: kg(t.nameplate_charge, t.mass_unit) ?? '',
        addedChargeKg: kg(t.added_charge, t.mass_unit) ?? '0',
        startWeightKg: start,
        endWeightKg: end,
        recoveredMassKg: kg(t.recovered_mass, t.mass_unit) ?? (Number(end) - Number(start)).toFixed(9),
        massUnit: t.mass_unit as MassUnit,
        finalVacuumKpaAbs: vacuumUnit ? String(vacuumToKpaAbs(Number(t.final_vacuum), vacuumUnit)) : null,
        vacuumUnit,
        holdMinutes: t.hold_minutes ? Number(t.hold_minutes) : null,
        holdRiseKpa: t.hold_rise && vacuumUnit ? String(riseToKpa(Number(t.hold_rise), vacuumUnit)) : null,
        cylinderId: cylinderIds.get(t.cylinder ?? '') ?? null,
        disposition: t.disposition as Disposition,
        manufacturedOn: t.manufactured_on || null,
        technicianCertification: (t.technician_certification || null) as CertificationType | null,
        notes: t.notes || null,
        entered: Object.fromEntries(Object.entries(t).filter(([, value]) => value)),
      };
    });
    for (let i = 0; i < rows.length; i += CHUNK) await tx.insert(recoveries).values(rows.slice(i, i + CHUNK));
  });
