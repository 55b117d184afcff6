import { type Random, seededRandom } from '../random';
import { drawClimate, drawVolumes } from './climate';
import { drawCrew, type Worker, whoWorks } from './crew';
import { openCylinders } from './cylinders';
import { JOB_SHARES, KINDS, type Kind } from './kinds';
import { daysInMonth, monthOfYear, monthsFromTo } from './months';
import { type SimulationOptions, usualOptions } from './options';
import { drawBases, type Pull, pullDown } from './pull';
import { recoveryFile, type SimulatedRow } from './row';
import { writeDown } from './slips';
import type { SimulatedTruth } from './truth';
import { unitBook } from './visits';
import { plain, weigh } from './weighing';

const JOBS = Object.keys(JOB_SHARES) as (keyof typeof JOB_SHARES)[];
const two = (value: number) => String(value).padStart(2, '0');

type Job = { row: SimulatedRow; pull: Pull };

const timeIn = (month: string, random: Random): string => {
  const day = two(random.integer(1, daysInMonth(month)));
  return `${month}-${day}T${two(random.integer(7, 17))}:${two(random.integer(0, 59))}:00`;
};

/** Plays the work of all months; the rows of a month come in the order of its dates, as a ledger has them. */
const play = (options: SimulationOptions, crew: readonly Worker[], random: Random): Job[] => {
  const months = monthsFromTo(options.firstMonth, options.lastMonth);
  const climate = drawClimate(months, random.fork('climate'));
  const bases = drawBases(KINDS, random.fork('bases'));
  const volumes = drawVolumes(KINDS, months, options, climate, random.fork('volumes'));
  const book = unitBook(Math.round(20 + options.size / 25), random.fork('units'));
  const cylinders = openCylinders(random.fork('cylinders'));
  const dice = random.fork('jobs');

  const one = (month: string, kind: Kind): Job => {
    const type = dice.pick(JOBS, (job) => JOB_SHARES[job]);
    const unit = book.visit(kind, type, Number(month.slice(0, 4)) + monthOfYear(month) / 12 - climate.mixShiftYears);
    const worker = whoWorks(crew, month, kind, type, dice);
    const pull = pullDown({ kind, type, month, worker, base: bases.get(kind) ?? 3 }, dice);
    worker.jobsDone++;
    worker.yieldLead += pull.yieldLead;
    const pulledLb = unit.nameplateLb * pull.share;
    const cylinder = cylinders.take(worker.name, unit.refrigerant, pulledLb);
    const weighing = weigh(cylinder, pulledLb, { kind, worker, month }, dice);
    const row = {
      recorded: timeIn(month, dice),
      technician: worker.name,
      site: unit.site,
      appliance: unit.name,
      appliance_category: kind.category,
      refrigerant: unit.refrigerant,
      nameplate_charge: plain(unit.nameplateLb),
      start_weight: weighing.start,
      end_weight: weighing.end,
      recovered_mass: weighing.recovered,
      final_vacuum: plain(pull.vacuumInHg, 1),
      job_type: type,
      cylinder: cylinder.serial,
    };
    return { row, pull };
  };

  return months
    .flatMap((month) => {
      const jobs = volumes.filter((cell) => cell.month === month).flatMap(({ kind, jobs }) => Array(jobs).fill(kind));
      return jobs.map((kind: Kind) => one(month, kind));
    })
    .sort((a, b) => (a.row.recorded < b.row.recorded ? -1 : 1));
};

/**
 * Makes up a company: its recovery file as an office would export it, and what was planted in it. Volumes, appliances,
 * charges on arrival, efficiencies, people and slips are drawn from one seed.
 */
export const simulateCompany = (
  seed: string,
  changes: Partial<SimulationOptions> = {},
): { file: string; truth: SimulatedTruth } => {
  const options = { ...usualOptions, ...changes };
  const random = seededRandom(`simulated company ${seed}`);
  const crew = drawCrew(options, random.fork('crew'));
  const jobs = play(options, crew, random);
  const pen = random.fork('pen');
  const written = jobs.flatMap(({ row, pull }) =>
    writeDown(row, options.slipShare, pen).map((line) => ({ ...line, pull })),
  );

  const badRecords: SimulatedTruth['bad_records'] = [];
  const naturallyLow: number[] = [];
  written.forEach(({ fault, pull }, index) => {
    const kinds = [...(fault ? [fault] : []), ...(pull.stoppedEarly ? (['stopped_early'] as const) : [])];
    if (kinds.length) badRecords.push({ row: index + 1, kinds });
    else if (pull.shortOnArrival) naturallyLow.push(index + 1);
  });
  const truth: SimulatedTruth = {
    seed,
    technicians: crew.map((worker) => ({
      name: worker.name,
      class: worker.class,
      skill_logit: worker.skill,
      learning: worker.learning && { start_drop_logit: worker.learning.drop, jobs_scale: worker.learning.jobs },
      stops_early_rate: worker.stopsEarly,
      first_month: worker.firstMonth,
      last_month: worker.lastMonth,
      records: worker.jobsDone,
      true_yield_points: (100 * worker.yieldLead) / Math.max(1, worker.jobsDone),
    })),
    planted_bad_technicians: crew.filter(({ class: of }) => of.startsWith('bad_')).map(({ name }) => name),
    planted_drifting_scale: crew.flatMap(({ name, drift }) =>
      drift ? [{ technician: name, from_month: drift.fromMonth, factor: drift.factor }] : [],
    ),
    bad_records: badRecords,
    naturally_low_rows: naturallyLow,
  };
  return { file: recoveryFile(written.map(({ row }) => row)), truth };
};
