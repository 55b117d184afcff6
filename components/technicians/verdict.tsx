import { clsx } from 'clsx';
import type { TechnicianRow } from '@/analytics/technicians/contract';

type Verdict = TechnicianRow['verdict'];

const WORDS: Record<Verdict, string> = {
  below: 'below',
  within: 'within',
  above: 'above',
  'too few': 'too few jobs to say',
};

/** What follows from a verdict for the reader, besides it. */
export const verdictAside = ({ verdict, look, scale }: Pick<TechnicianRow, 'verdict' | 'look' | 'scale'>): string => {
  if (scale && scale.to === null) return 'check the scale';
  return look && verdict !== 'below' && verdict !== 'too few' ? 'worth a look' : '';
};

/** The verdict in a word, marked when it asks for something; the colour only repeats it. */
export const VerdictWord = ({ result }: { result: Pick<TechnicianRow, 'verdict' | 'look' | 'scale'> }) => {
  const aside = verdictAside(result);
  return (
    <span className="whitespace-nowrap">
      <span
        className={clsx(
          result.verdict === 'below' && 'border-b-3 border-flag font-semibold',
          result.verdict === 'too few' && 'text-ink-2',
        )}
      >
        {WORDS[result.verdict]}
      </span>
      {aside ? <span className="block text-sm text-ink-2">{aside}</span> : null}
    </span>
  );
};
