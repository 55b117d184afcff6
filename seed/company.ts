import { additionsBook, type DemoAddition } from './additions';
import { makePlaces } from './appliances';
import { monthsUntil } from './calendar';
import { type Cylinder, cylinderPool } from './cylinders';
import type { Plan } from './plan';
import { seededRandom } from './random';
import { playRecoveries } from './recoveries';
import { makeSites, type Site } from './sites';
import { makeTechnicians, type Technician } from './technicians';
import type { Ticket } from './ticket';
import type { DemoTruth } from './truth';

/** A whole invented company: who and what there is, every ticket, and what was planted. */
export type DemoCompany = {
  plan: Plan;
  technicians: readonly Technician[];
  sites: readonly Site[];
  cylinders: readonly Cylinder[];
  tickets: readonly Ticket[];
  additions: readonly DemoAddition[];
  truth: DemoTruth;
};

/** Makes the company up. The same plan gives the same company, to the last digit. */
export const makeCompany = (plan: Plan): DemoCompany => {
  const random = seededRandom(plan.seed);
  const months = monthsUntil(plan.endMonth, plan.months);
  const sites = makeSites(plan, random.fork('sites'));
  const technicians = makeTechnicians(plan, months, random.fork('technicians'));
  const places = makePlaces(plan, sites, months[0] ?? plan.endMonth, random.fork('places'));
  const pool = cylinderPool(plan.company.slice(0, 2).toUpperCase(), random.fork('pool'));
  const truth: DemoTruth = {
    faults: [],
    shortOnArrival: [],
    technicians: [],
    driftingScale: null,
    monthlyMassKg: {},
    chronicLeaks: [],
  };
  const book = additionsBook(plan.endMonth, random.fork('additions'));
  const world = { plan, months, crew: technicians, places, pool, book, truth };
  const tickets = playRecoveries(world, random.fork('recoveries'));
  for (const place of places) book.atInstall(place, months[0] ?? plan.endMonth);
  truth.chronicLeaks = places
    .flatMap(({ units }) => units)
    .filter(({ leaksAgain }) => leaksAgain)
    .map((unit) => `${unit.site.name} / ${unit.name}`);
  // An addition is written down for units that are on record.
  const onRecord = new Set(tickets.map(({ site, appliance }) => `${site} / ${appliance}`));
  const additions = book.additions
    .filter(({ site, appliance }) => onRecord.has(`${site} / ${appliance}`))
    .sort((a, b) => a.addedOn.localeCompare(b.addedOn));
  return { plan, technicians, sites, cylinders: pool.all, tickets, additions, truth };
};
