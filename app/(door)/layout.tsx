import type { ReactNode } from 'react';
import { DoorPicture } from '@/components/shell/door-picture';
import { Wordmark } from '@/components/shell/mark';

/** The way in: the form on the left, what stands behind the door on the right. */
export default function DoorLayout({ children }: { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col border-t-6 border-shoulder lg:grid lg:grid-cols-[minmax(24rem,1fr)_minmax(0,1.25fr)]">
      <main id="main" className="flex flex-col bg-sheet px-5 pt-8 pb-10 sm:px-10 lg:px-14">
        <Wordmark />
        <div className="my-10 w-full max-w-sm lg:my-auto">{children}</div>
      </main>
      <aside
        aria-label="What Tarebook is"
        className="flex flex-1 flex-col justify-center gap-10 px-5 py-12 sm:px-10 lg:px-16 xl:px-24"
      >
        <div className="max-w-2xl">
          <p className="text-2xl font-semibold tracking-tight text-balance">
            Every recovery is a number on a scale. Tarebook says whether it is any good.
          </p>
          <p className="mt-3 text-ink-2">
            It reads a contractor’s recovery tickets and answers what nobody can see from them: how much of each
            refrigerant came in, which pulls were low, and whether it was the season, a leak, the cylinder or the work.
            Every figure opens the records that make it.
          </p>
        </div>
        <DoorPicture />
      </aside>
    </div>
  );
}
