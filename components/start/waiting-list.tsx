import Link from 'next/link';
import type { WaitingItem } from '@/analytics/start/contract';
import { formatCount } from '@/lib/format';

/** The few things that wait: how many as a figure, what and why beside it, and the way there. */
export const WaitingList = ({ items }: { items: readonly WaitingItem[] }) => (
  <section aria-labelledby="what-waits">
    <h2 id="what-waits" className="border-b-2 border-ink pb-1.5 text-lg font-semibold">
      What waits
    </h2>
    {items.length ? (
      <ul>
        {items.map(({ kind, count, what, why, verb, href }) => (
          <li key={kind} className="flex items-baseline gap-x-4 border-b border-rule py-4 sm:gap-x-6">
            <span className="w-16 shrink-0 font-mono text-xl font-medium">
              <span className="marked">{formatCount(count)}</span>
            </span>
            <div className="min-w-0">
              <p className="font-semibold">{what}</p>
              <p className="mt-0.5 max-w-prose break-words text-ink-2">{why}</p>
              <p className="mt-1.5">
                <Link href={href} className="link inline-flex items-center pointer-coarse:min-h-11">
                  {verb}
                  <span className="sr-only">
                    : {formatCount(count)} {what}
                  </span>
                </Link>
              </p>
            </div>
          </li>
        ))}
      </ul>
    ) : (
      <p className="py-4 text-ink-2">Nothing waits for you.</p>
    )}
  </section>
);
