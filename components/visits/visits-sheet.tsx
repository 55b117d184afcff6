'use client';

import dynamic from 'next/dynamic';
import type { Visit } from '@/analytics/visits/contract';
import { useWidth } from '@/components/charts/use-width';
import { FileButtons } from '@/components/files/file-buttons';
import { Sheet } from '@/components/ui/sheet';
import { Loading } from '@/components/ui/states';
import { plainCharacters } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { visitsFile } from './visits-file';
import { VisitsTable } from './visits-table';

const HEIGHT = 330;

const VisitsPicture = dynamic(() => import('./visits-picture').then((module) => module.VisitsPicture), {
  ssr: false,
  loading: () => <Loading label="Drawing the chart" minHeight={HEIGHT} />,
});

type VisitsSheetProps = {
  place: string;
  visits: readonly Visit[];
  unit: DisplayUnit;
  changed?: ReadonlySet<string>;
  withAppliance?: boolean;
};

const NONE: ReadonlySet<string> = new Set();

/** The visits to a place: in time as a picture, then each of them. */
export const VisitsSheet = ({ place, visits, unit, changed = NONE, withAppliance = false }: VisitsSheetProps) => {
  const [measured, width] = useWidth();
  return (
    <Sheet
      title="Visits"
      aside={`ringed: far below like jobs${changed.size ? '; marked: a new nameplate charge' : ''}`}
      tools={<FileButtons makeTable={() => visitsFile(plainCharacters(place), visits, unit)} />}
    >
      <figure ref={measured} className="m-0 mb-4 min-w-0 overflow-hidden" style={{ minHeight: HEIGHT }}>
        {width > 0 ? <VisitsPicture visits={visits} unit={unit} width={width} /> : null}
      </figure>
      <VisitsTable
        label={`Visits to ${place}`}
        visits={visits}
        unit={unit}
        changed={changed}
        withAppliance={withAppliance}
      />
    </Sheet>
  );
};
