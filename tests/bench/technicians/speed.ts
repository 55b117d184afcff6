import { compareTechnicians } from '@/analytics/technician-comparison/compare-technicians';
import { simulateCompany } from '@/seed/simulation/simulate-company';
import { comparedRecoveriesOf } from './simulated';

const RECORDS = 100_000;
const TECHNICIANS = 30;
const RUNS = 5;

/** Time of the processor, so that other work on the machine does not count, for a large company: the records of several, dealt out to thirty technicians. */
export const measureSpeed = async (): Promise<void> => {
  const one = await comparedRecoveriesOf(simulateCompany('speed', { size: 20_000 }).file);
  const many = Array.from({ length: Math.ceil(RECORDS / one.length) }, () => one)
    .flat()
    .slice(0, RECORDS)
    .map((job, at) => ({ ...job, technicianId: `${job.technicianId} ${at % 3}` }))
    .sort((a, b) => (a.recoveredOn < b.recoveredOn ? -1 : Number(a.recoveredOn > b.recoveredOn)));
  const names = [...new Set(many.map(({ technicianId }) => technicianId))];
  const folded = many.map((job) => ({ ...job, technicianId: String(names.indexOf(job.technicianId) % TECHNICIANS) }));
  const times = Array.from({ length: RUNS }, () => {
    const from = process.cpuUsage().user;
    compareTechnicians(folded);
    return (process.cpuUsage().user - from) / 1000;
  }).sort((a, b) => a - b);
  console.log(
    `\n${folded.length} records, ${TECHNICIANS} technicians: ${Math.round(times[Math.floor(RUNS / 2)] ?? 0)} ms of computing, median of ${RUNS}`,
  );
};
