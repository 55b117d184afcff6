import type { Disposition, JobType } from '@/lib/vocabulary';
import type { AdditionsBook } from './additions';
import { type Appliance, type Place, replaceUnit, unitAt } from './appliances';
import { assign } from './assign';
import type { CylinderPool } from './cylinders';
import { EQUIPMENT } from './equipment';
import { openCylinders } from './open-cylinders';
import type { Plan } from './plan';
import { fullChargeLb, pullDown } from './pull';
import type { Random } from './random';
import { conversionOf } from './refrigerant-mix';
import { type Visit, visitsOf } from './shifts';
import { withSlips } from './slips';
import { atWork, type Technician } from './technicians';
import { type Ticket, writeTicket } from './ticket';
import type { DemoTruth } from './truth';

const KG_PER_LB = 0.45359237;
const DRIFT_FACTOR = 0.925;
const DRIFT_MONTHS = 14;

const dispositionOf = (unit: Appliance, job: JobType, random: Random): Disposition => {
  const large = fullChargeLb(unit) > 100;
  if (job === 'disposal' && large) return 'to_reclaimer';
  if (job === 'disposal' || job === 'conversion') return 'in_cylinder';
  return random.chance(large ? 0.6 : 0.05) ? 'returned_to_system' : 'in_cylinder';
};

/** Plays the months through, visit by visit, and gives the tickets; the truth is filled on the way. */
export const playRecoveries = (
  world: {
    plan: Plan;
    months: readonly string[];
    crew: readonly Technician[];
    places: readonly Place[];
    pool: CylinderPool;
    book: AdditionsBook;
    truth: DemoTruth;
  },
  random: Random,
): Ticket[] => {
  const { plan, months, crew, places, pool, book, truth } = world;
  const cylinders = openCylinders(pool, random.fork('cylinders'));
  const done = new Map<string, { pulls: number; efficiency: number }>();
  const drifting = crew.find(({ habit }) => habit === 'drifting_scale');
  const driftFrom = months.at(-DRIFT_MONTHS) ?? plan.endMonth;
  if (drifting) truth.driftingScale = { technician: drifting.name, fromMonth: driftFrom, factor: DRIFT_FACTOR };
  const numbers = new Map<string, number>();
  const refFor = (year: string) => {
    const next = (numbers.get(year) ?? 0) + 1;
    numbers.set(year, next);
    return `${year.slice(2)}-${String(next).padStart(4, '0')}`;
  };

  const play = (visit: Visit, month: string, draw: Random): Ticket[] => {
    const { place, day } = visit;
    const unit = unitAt(place);
    const successor = visit.type === 'conversion' ? conversionOf(unit.refrigerant, unit.equipment.kind, draw) : null;
    const type = visit.type === 'conversion' && !successor ? 'service' : visit.type;
    const technician = assign(atWork(crew, month), unit, type, draw);
    const before = done.get(technician.name) ?? { pulls: 0, efficiency: 0 };
    const pull = pullDown(unit, { type, day, technician, jobsBefore: before.pulls }, draw);
    done.set(technician.name, { pulls: before.pulls + 1, efficiency: before.efficiency + pull.efficiency });

    const filling = cylinders.choose(technician, unit.refrigerant, fullChargeLb(unit), day);
    const disposition = dispositionOf(unit, type, draw);
    const recordRef = refFor(day.slice(0, 4));
    const scaleFactor = technician === drifting && month >= driftFrom ? DRIFT_FACTOR : 1;
    const job = { ...visit, type, recordRef, unit, technician, cylinder: filling.cylinder, disposition, scaleFactor };
    const ticket = writeTicket(job, pull, draw);
    const past = cylinders.fill(filling, pull.recoveredLb, disposition);

    book.afterPull(unit, { type, day }, pull);
    if (pull.stoppedEarly) truth.faults.push({ recordRef, fault: 'stopped_early' });
    if (filling.fault === 'mixed_cylinder') truth.faults.push({ recordRef, fault: 'mixed_cylinder' });
    if (filling.fault === 'overfilled' && past) truth.faults.push({ recordRef, fault: 'overfilled' });
    if (pull.shortOnArrival) truth.shortOnArrival.push(recordRef);
    const sums = truth.monthlyMassKg[month] ?? {};
    truth.monthlyMassKg[month] = sums;
    sums[unit.refrigerant] = (sums[unit.refrigerant] ?? 0) + pull.recoveredLb * KG_PER_LB;

    if (successor) unit.refrigerant = successor;
    if (type === 'disposal') replaceUnit(place, month, draw);
    const nextRef = () => refFor(day.slice(0, 4));
    return withSlips(ticket, pull.recoveredLb * scaleFactor, { nextRef, truth, random: draw });
  };

  const byKind = new Map(EQUIPMENT.map((kind) => [kind, places.filter(({ equipment }) => equipment === kind)]));
  const firstMonth = months[0] ?? plan.endMonth;
  const tickets = months.flatMap((month) => {
    const draw = random.fork(month);
    const context = { plan, firstMonth, placesOf: (kind: Place['equipment']) => byKind.get(kind) ?? [] };
    return visitsOf(month, context, draw.fork('visits')).flatMap((visit) => play(visit, month, draw));
  });
  truth.technicians = crew.map(({ name, habit, coachedOn }) => {
    const { pulls, efficiency } = done.get(name) ?? { pulls: 0, efficiency: 0 };
    return { name, habit, coachedOn, pulls, meanEfficiency: pulls ? efficiency / pulls : 0 };
  });
  return tickets;
};
