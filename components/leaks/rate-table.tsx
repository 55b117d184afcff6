'use client';

import { useState } from 'react';
import type { ApplianceLeaks } from '@/analytics/leak-rate/contract';
import { rateText, triggerText } from '@/analytics/leak-rate/sentence';
import { TextButton } from '@/components/ui/button';
import { Table, Td, Th } from '@/components/ui/table';
import { formatCount, formatDay, formatList, formatMass } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { ADDITION_REASON_NAMES } from '@/lib/wording';

type Event = ApplianceLeaks['events'][number];

const periodText = ({ rate }: Event): string => {
  if (!rate) return '';
  if (rate.leaksVerifiedOn) return `since the test of ${formatDay(rate.leaksVerifiedOn)}`;
  return rate.after ? `since ${formatDay(rate.after)}` : 'no earlier addition known';
};

/** So many days of additions are shown before somebody asks for all. */
const SHOWN = 12;

type RateTableProps = { label: string; events: readonly Event[]; unit: DisplayUnit };

/** Each day on which refrigerant was added with the leak rate it makes, the newest first. */
export const RateTable = ({ label, events, unit }: RateTableProps) => {
  const [all, setAll] = useState(false);
  const newest = [...events].reverse();
  return (
    <>
      <Table label={label}>
        <thead>
          <tr>
            <Th>Day</Th>
            <Th numeric>Leak rate (range)</Th>
            <Th>Against the rule</Th>
            <Th numeric>Added, {unit}</Th>
            <Th numeric>Leaked, {unit}</Th>
            <Th>Why</Th>
            <Th>Period</Th>
          </tr>
        </thead>
        <tbody>
          {(all ? newest : newest.slice(0, SHOWN)).map((event) => (
            <tr key={event.addedOn}>
              <Th scope="row" className="whitespace-nowrap">
                {formatDay(event.addedOn)}
              </Th>
              <Td numeric>{event.rate ? rateText(event.rate) : 'none'}</Td>
              <Td className="min-w-44">
                {event.rate?.above ? (
                  <span className="marked">{triggerText(event.rate)}</span>
                ) : event.rate ? (
                  triggerText(event.rate) || 'no rule held'
                ) : (
                  'no leak'
                )}
              </Td>
              <Td numeric>{formatMass(event.added, unit)}</Td>
              <Td numeric>{formatMass(event.counted, unit)}</Td>
              <Td>{formatList(event.reasons.map((reason) => ADDITION_REASON_NAMES[reason]))}</Td>
              <Td className="min-w-40">{periodText(event)}</Td>
            </tr>
          ))}
        </tbody>
      </Table>
      {newest.length > SHOWN && !all ? (
        <TextButton className="mt-2 print:hidden" onClick={() => setAll(true)}>
          Show all {formatCount(newest.length)} days
        </TextButton>
      ) : null}
    </>
  );
};
