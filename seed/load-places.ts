import { randomUUID } from 'node:crypto';
import { withCompanyJob } from '@/db/client';
import { branches, cylinders, sites, technicianCertifications, technicians } from '@/db/schema/places';
import { massToKg } from '@/lib/units';
import type { DemoCompany } from './company';

const pounds = (lb: number): string | null => massToKg(String(lb), 'lb');

/**
 * Writes what a company sets up before its tickets come: branches, crew with certifications, sites, cylinders. The
 * tickets find them by name.
 */
export const loadPlaces = (companyId: string, company: DemoCompany): Promise<void> =>
  withCompanyJob({ companyId, actor: 'demo' }, async (tx) => {
    const branchIds = new Map(company.plan.branches.map((name) => [name, randomUUID()]));
    const branchId = (name: string) => branchIds.get(name) ?? null;
    await tx.insert(branches).values([...branchIds].map(([name, id]) => ({ companyId, id, name })));

    const crew = company.technicians.map((technician) => ({ ...technician, id: randomUUID() }));
    await tx.insert(technicians).values(
      crew.map(({ id, name, branch, untilMonth }) => ({
        companyId,
        id,
        name,
        branchId: branchId(branch),
        active: untilMonth === null,
      })),
    );
    await tx.insert(technicianCertifications).values(
      crew.map(({ id, certification, cardNumber, fromMonth }) => ({
        companyId,
        technicianId: id,
        type: certification,
        cardNumber,
        certifiedOn: `${fromMonth}-01`,
      })),
    );
    await tx
      .insert(sites)
      .values(
        company.sites.map(({ name, branch, address }) => ({ companyId, name, branchId: branchId(branch), address })),
      );
    await tx.insert(cylinders).values(
      company.cylinders.map(
        ({ serial, refrigerant, branch, specification, requalifiedOn, tareLb, waterCapacityLb }) => ({
          companyId,
          name: serial,
          refrigerant,
          branchId: branchId(branch),
          specification,
          requalifiedOn,
          tareWeightKg: pounds(tareLb),
          waterCapacityKg: pounds(waterCapacityLb),
        }),
      ),
    );
  });
