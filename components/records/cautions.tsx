import { Notice } from '@/components/ui/notice';

const CAUTIONS = [
  'Isolate the power and prove it dead before you open anything.',
  'Protect eyes and hands: liquid refrigerant freezes what it touches.',
  'Ventilate, and watch for displaced air: refrigerant gathers low down and pushes out what you breathe.',
  'A flammable refrigerant needs equipment rated for it and no source of ignition anywhere near.',
  'One refrigerant to a cylinder: never mix.',
  'Never fill a cylinder past its limit, and stop at its pressure limit.',
] as const;

/** What can hurt somebody, said before the first weight is taken. */
export const Cautions = () => (
  <Notice tone="warning" title="Before you connect" className="mb-6">
    <ul className="list-disc pl-5">
      {CAUTIONS.map((caution) => (
        <li key={caution}>{caution}</li>
      ))}
    </ul>
    <p className="mt-2">
      The label and the manufacturer’s instructions go before anything written here; local codes and licensed practice
      decide. Tarebook records and warns. It does not tell you that a step is safe.
    </p>
  </Notice>
);
