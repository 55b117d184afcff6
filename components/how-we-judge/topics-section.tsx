import type { ReactNode } from 'react';
import { Sheet } from '@/components/ui/sheet';

/** One thing that is judged: what is looked at, what it does not mean, and where the method comes from. */
export type Topic = { name: string; looksAt: ReactNode; doesNotMean: ReactNode; source: string };

/** Some topics side by side. */
export const TopicsSection = ({ id, title, topics }: { id: string; title: string; topics: readonly Topic[] }) => (
  <Sheet title={<span id={id}>{title}</span>}>
    <dl className="grid gap-x-10 gap-y-6 md:grid-cols-2">
      {topics.map(({ name, looksAt, doesNotMean, source }) => (
        <div key={name} className="max-w-prose">
          <dt className="font-semibold">{name}</dt>
          <dd className="mt-1">{looksAt}</dd>
          <dd className="mt-1.5 text-ink-2">{doesNotMean}</dd>
          <dd className="mt-1.5 text-sm text-ink-3">{source}</dd>
        </div>
      ))}
    </dl>
  </Sheet>
);
