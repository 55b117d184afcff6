'use client';

import { useCylinderContent } from '@/analytics/records/hook';
import { Term } from '@/components/glossary/term';
import { Notice } from '@/components/ui/notice';
import { formatDay, formatDesignation } from '@/lib/format';
import type { RecordTexts } from '@/lib/recoveries/fields';

// R410A, 410a and R-410A are one, as the server reads them.
const sameRefrigerant = (one: string, other: string): boolean => {
  const bare = (text: string) =>
    text
      .toLowerCase()
      .replace(/[^a-z0-9]/g, '')
      .replace(/^r(?=\d)/, '');
  return bare(one) === bare(other);
};

type CylinderCautionProps = { texts: Pick<RecordTexts, 'cylinder' | 'refrigerant'>; known: readonly string[] };

/** Said where the cylinder is chosen: its limit, and what it held before when that is another refrigerant. */
export const CylinderCaution = ({ texts, known }: CylinderCautionProps) => {
  const name = texts.cylinder.trim();
  const { data } = useCylinderContent(known.includes(name) ? name : null);
  const others = [
    data?.last && !sameRefrigerant(data.last.refrigerant, texts.refrigerant)
      ? `By the records ${formatDesignation(data.last.refrigerant)} went into it last, on ${formatDay(data.last.recoveredOn)}.`
      : '',
    data?.meantFor && data.meantFor !== data.last?.refrigerant && !sameRefrigerant(data.meantFor, texts.refrigerant)
      ? `It is set down for ${formatDesignation(data.meantFor)}.`
      : '',
  ].filter(Boolean);
  return (
    <div className="mb-5">
      <p className="max-w-prose text-sm text-ink-2">
        Never fill a cylinder past its <Term id="fill-limit">limit</Term>, and never put two refrigerants into one:{' '}
        <Term id="mixed">mixed</Term> refrigerant can be dangerous and is lost. The label on the cylinder goes before
        what stands here.
      </p>
      <div aria-live="polite">
        {others.length && texts.refrigerant.trim() ? (
          <Notice
            tone="warning"
            title={`Stop before ${name} is filled with ${formatDesignation(texts.refrigerant)}`}
            className="mt-3"
          >
            {others.join(' ')} Look at the label. A cylinder that held another refrigerant takes no second one unless it
            was emptied and evacuated; licensed practice decides.
          </Notice>
        ) : null}
      </div>
    </div>
  );
};
