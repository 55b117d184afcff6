import { Loading } from '@/components/ui/states';

/** Holds the places of sentence, ticket and chart, so that nothing moves when the figures come. */
export const TrendsLoading = () => (
  <div className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_300px]">
    <div className="min-h-28" />
    <div className="min-h-96 bg-sheet lg:row-span-2 lg:self-start" />
    <div className="bg-sheet px-6 py-5">
      <Loading minHeight={540} />
    </div>
  </div>
);
