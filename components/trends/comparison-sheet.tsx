'use client';

import type { ScopeSelection } from '@/analytics/scope-address';
import type { TrendsComparison } from '@/analytics/trends-comparison/contract';
import { certaintyWords, likeForLikeWords, periodWords } from '@/analytics/trends-comparison/sentence';
import { parseVersus } from '@/analytics/trends-comparison/versus';
import { ScopePart } from '@/components/scope/scope-part';
import { TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { ComparisonTable } from './comparison-table';
import { MoversList } from './movers-list';
import type { ComparisonAddress } from './use-comparison-address';
import { VersusEditor } from './versus-editor';

const GWP_NAMES = { ar4: 'AR4', ar6: 'AR6' } as const;

type ComparisonSheetProps = {
  data: TrendsComparison | undefined;
  error: Error | null;
  scope: ScopeSelection;
  address: ComparisonAddress;
  className?: string;
};

/** The period against another one: every figure of both, how sure the change is, and what moved. */
export const ComparisonSheet = ({ data, error, scope, address, className }: ComparisonSheetProps) => {
  const { versus, gwp, setVersus, setGwp } = address;
  const comparison = data?.comparison ?? null;
  const other = gwp === 'ar4' ? 'ar6' : 'ar4';
  const doubtful = versus !== null && !parseVersus(versus);
  const named = comparison ? periodWords(comparison.before) : versus || 'a year before';
  return (
    <Sheet
      title={
        <>
          {comparison ? periodWords(comparison.now) : 'This period'} against{' '}
          <ScopePart
            label="Compared with"
            wide
            doubtful={doubtful}
            editor={(close) => (
              <VersusEditor now={comparison?.now ?? null} versus={versus} onApply={setVersus} close={close} />
            )}
          >
            {named}
          </ScopePart>
        </>
      }
      {...(className ? { className } : {})}
    >
      {comparison && data ? (
        <>
          <p className="mb-4 max-w-[54em] text-ink-2">
            {[certaintyWords(comparison), likeForLikeWords(comparison)].filter(Boolean).join(' ')}
          </p>
          <div className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)]">
            <ComparisonTable
              comparison={comparison}
              scope={scope}
              gwp={data.gwp}
              co2eLabel={
                <>
                  Kept from the air, t CO₂e
                  <span className="block text-xs text-ink-2">
                    GWP of {GWP_NAMES[data.gwp]}, 100 years
                    <span className="print:hidden">
                      ;{' '}
                      <TextButton onClick={() => setGwp(other)} className="text-xs">
                        use {GWP_NAMES[other]}
                      </TextButton>
                    </span>
                  </span>
                </>
              }
            />
            <MoversList comparison={comparison} by={data.by} scope={scope} />
          </div>
        </>
      ) : (
        <p role={error ? 'alert' : undefined} className="pb-2 text-ink-2">
          {error ? error.message : 'There are no records in that time to compare with.'}
        </p>
      )}
    </Sheet>
  );
};
