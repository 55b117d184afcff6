import type { Random } from './random';
import type { Ticket } from './ticket';
import type { DemoTruth, PlantedFault } from './truth';

/** One ticket in eighty is written wrongly. */
const SLIP_SHARE = 0.0125;

type Slip = { fault: PlantedFault; column?: string; ticket: Ticket };
type Writer = (ticket: Ticket, netLb: number, random: Random) => Slip | null;

/** Only what came out is written, so nothing beside it contradicts the slip. */
const netOnly = (ticket: Ticket, recovered: number): Ticket => ({
  ...ticket,
  start_weight: '',
  end_weight: '',
  recovered_mass: recovered.toFixed(1),
});

/** The first two digits changed over; null where that says the same or no longer looks like the number. */
const swapDigits = (text: string): string | null => {
  const swapped = text.replace(/^(\d)(\d)/, '$2$1');
  return swapped === text || swapped.startsWith('0') ? null : swapped;
};

const REFUSED: readonly { column: keyof Ticket; spoil: (ticket: Ticket) => Partial<Ticket> }[] = [
  { column: 'refrigerant', spoil: () => ({ refrigerant: 'R-41OA' }) },
  { column: 'recovered_at', spoil: ({ recovered_at = '' }) => ({ recovered_at: `${recovered_at.slice(0, 4)}-02-30` }) },
  { column: 'nameplate_charge', spoil: () => ({ nameplate_charge: '' }) },
  { column: 'technician', spoil: () => ({ technician: '' }) },
  { column: 'recovered_mass', spoil: () => ({ start_weight: '27.5', end_weight: '31.0', recovered_mass: '13.5' }) },
  { column: 'hold_minutes', spoil: () => ({ hold_minutes: 'ten' }) },
];

const WRITERS: Partial<Record<PlantedFault, Writer>> = {
  ounces_as_pounds: (ticket, net) => ({ fault: 'ounces_as_pounds', ticket: netOnly(ticket, net * 16) }),
  kilograms_as_pounds: (ticket, net) => ({ fault: 'kilograms_as_pounds', ticket: netOnly(ticket, net * 0.45359237) }),
  tenfold: (ticket, net, random) => ({
    fault: 'tenfold',
    ticket: netOnly(ticket, random.chance(0.7) ? net * 10 : net / 10),
  }),
  swapped_digits: (ticket, net) => {
    const end = ticket.start_weight ? swapDigits(ticket.end_weight ?? '') : null;
    const gained = Number(end) - Number(ticket.start_weight);
    if (end && gained > 0 && Math.abs(gained - net) > 2)
      return { fault: 'swapped_digits', ticket: { ...ticket, end_weight: end, recovered_mass: gained.toFixed(1) } };
    const recovered = swapDigits(net.toFixed(1));
    return recovered && Math.abs(Number(recovered) - net) > 2
      ? { fault: 'swapped_digits', ticket: netOnly(ticket, Number(recovered)) }
      : null;
  },
  nameplate_slip: (ticket, _net, random) => {
    const wrong = Number(ticket.nameplate_charge) * (random.chance(0.6) ? 10 : 0.1);
    return { fault: 'nameplate_slip', ticket: { ...ticket, nameplate_charge: String(Math.round(wrong * 100) / 100) } };
  },
  refused: (ticket, _net, random) => {
    const { column, spoil } = random.pick(REFUSED);
    return { fault: 'refused', column, ticket: { ...ticket, ...spoil(ticket) } };
  },
};

const WEIGHTS = {
  ounces_as_pounds: 2,
  kilograms_as_pounds: 2,
  tenfold: 2.5,
  swapped_digits: 2.5,
  nameplate_slip: 1.5,
  refused: 2,
  doubled: 2,
} as const;
const KINDS = Object.keys(WEIGHTS) as (keyof typeof WEIGHTS)[];

/**
 * Sometimes spoils a ticket as people do and notes it in the truth. `nextRef` numbers the second copy of a ticket that
 * is typed in twice. Slips are made in pounds, where the figures are easiest to mistake.
 */
export const withSlips = (
  ticket: Ticket,
  netLb: number,
  { nextRef, truth, random }: { nextRef: () => string; truth: DemoTruth; random: Random },
): Ticket[] => {
  if (ticket.mass_unit !== 'lb' || netLb < 1 || !random.chance(SLIP_SHARE)) return [ticket];
  const kind = random.pick(KINDS, (k) => WEIGHTS[k]);
  if (kind === 'doubled') {
    const copy = { ...ticket, record_ref: nextRef() };
    truth.faults.push({ recordRef: copy.record_ref, fault: 'doubled' });
    return [ticket, copy];
  }
  const slip = WRITERS[kind]?.(ticket, netLb, random);
  if (!slip) return [ticket];
  truth.faults.push({
    recordRef: ticket.record_ref,
    fault: slip.fault,
    ...(slip.column ? { column: slip.column } : {}),
  });
  return [slip.ticket];
};
