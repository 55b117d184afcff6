'use client';

import { LOW_ORDERS, type LowOrder } from '@/analytics/low-recoveries/orders';
import { TextButton } from '@/components/ui/button';

const NAMES: Record<LowOrder, string> = { extreme: 'furthest below first', newest: 'newest first' };

/** In which order the list stands, and the other one to choose. */
export const OrderChoice = ({ order, onChange }: { order: LowOrder; onChange: (order: LowOrder) => void }) => (
  <span className="inline-flex flex-wrap gap-x-3">
    <span>{NAMES[order]}</span>
    {LOW_ORDERS.filter((other) => other !== order).map((other) => (
      <TextButton key={other} onClick={() => onChange(other)}>
        {NAMES[other]}
      </TextButton>
    ))}
  </span>
);
