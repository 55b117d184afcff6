'use client';

import { PAGE_SIZES, type PageSize } from '@/analytics/records/constants';
import type { RecordList } from '@/analytics/records/contract';
import { Button } from '@/components/ui/button';
import { Select } from '@/components/ui/field';

type PagerProps = {
  list: RecordList;
  limit: PageSize;
  onPage: (cursor: string | null) => void;
  onLimit: (limit: PageSize) => void;
};

/** To the page before and after, and how many records a page has. */
export const Pager = ({ list, limit, onPage, onLimit }: PagerProps) => (
  <nav aria-label="Pages" className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3 print:hidden">
    <div className="flex gap-3">
      <Button disabled={!list.previousCursor} onClick={() => onPage(list.previousCursor)}>
        ← Page before
      </Button>
      <Button disabled={!list.nextCursor} onClick={() => onPage(list.nextCursor)}>
        Next page →
      </Button>
    </div>
    <div className="w-36">
      <Select
        aria-label="Records a page"
        value={limit}
        onChange={(event) => onLimit(PAGE_SIZES.find((size) => size === Number(event.target.value)) ?? PAGE_SIZES[0])}
      >
        {PAGE_SIZES.map((size) => (
          <option key={size} value={size}>
            {size} a page
          </option>
        ))}
      </Select>
    </div>
  </nav>
);
