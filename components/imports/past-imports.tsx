'use client';

import { useInfiniteQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { Empty, Failed, Loading } from '@/components/ui/states';
import { Table, Td, Th } from '@/components/ui/table';
import { useViewer } from '@/components/viewer-context';
import { formatCount, formatInstant } from '@/lib/format';
import { importListOptions } from './import-api';
import { statusWords } from './import-words';

/** What was handed in before, newest first, with what became of it. */
export const PastImports = () => {
  const { timeZone } = useViewer();
  const { data, error, isPending, refetch, hasNextPage, fetchNextPage, isFetchingNextPage } =
    useInfiniteQuery(importListOptions);
  const items = data?.pages.flatMap((page) => page.items) ?? [];
  return (
    <Sheet
      title="Files handed in"
      tools={
        hasNextPage ? (
          <TextButton disabled={isFetchingNextPage} onClick={() => fetchNextPage()}>
            {isFetchingNextPage ? 'Reading' : 'Show more'}
          </TextButton>
        ) : undefined
      }
    >
      {isPending ? <Loading label="Reading the list of imports" /> : null}
      {error ? <Failed error={error} onRetry={refetch} /> : null}
      {data && items.length === 0 ? <Empty title="No file has been handed in yet" /> : null}
      {items.length ? (
        <Table label="Files handed in">
          <thead>
            <tr>
              <Th>File</Th>
              <Th>State</Th>
              <Th>Handed in</Th>
              <Th numeric>New</Th>
              <Th numeric>Changed</Th>
              <Th numeric>Unchanged</Th>
              <Th numeric>Refused</Th>
            </tr>
          </thead>
          <tbody>
            {items.map((item) => (
              <tr key={item.id}>
                <Th scope="row" className="max-w-52 break-words md:max-w-80">
                  <Link className="link" href={`/imports/${item.id}`}>
                    {item.fileName}
                  </Link>
                </Th>
                <Td className="whitespace-nowrap">{statusWords(item)}</Td>
                <Td className="whitespace-nowrap">{formatInstant(item.createdAt, timeZone)}</Td>
                <Td numeric>{formatCount(item.added)}</Td>
                <Td numeric>{formatCount(item.updated)}</Td>
                <Td numeric>{formatCount(item.unchanged)}</Td>
                <Td numeric>{formatCount(item.rejected)}</Td>
              </tr>
            ))}
          </tbody>
        </Table>
      ) : null}
    </Sheet>
  );
};
