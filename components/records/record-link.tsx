'use client';

import Link from 'next/link';
import { useSearchParams } from 'next/navigation';
import { type ReactNode, useContext } from 'react';
import { ListAddress } from './list-address';

type RecordLinkProps = { id: string; className?: string; children: ReactNode };

const behind = (search: string): string => (search ? `?${search}` : '');

const useListSearch = (): string => {
  const own = behind(useSearchParams().toString());
  return useContext(ListAddress) ?? own;
};

/** Leads to a record and takes the address of the list along, so that the way back leads to the same rows. */
export const RecordLink = ({ id, className, children }: RecordLinkProps) => {
  const search = useListSearch();
  return (
    <Link href={`/records/${id}${search}`} {...(className ? { className } : {})}>
      {children}
    </Link>
  );
};

/** The way back to the list as it was left. */
export const BackToRecords = () => {
  const search = useSearchParams().toString();
  return (
    <p className="mb-3 print:hidden">
      <Link href={`/records${behind(search)}`} className="link">
        ← All records
      </Link>
    </p>
  );
};
