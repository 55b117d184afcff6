'use client';

import { useState } from 'react';
import { useExplained } from '@/analytics/explain/hook';
import type { Figure } from '@/analytics/figures/figure';
import { Drawer } from '@/components/ui/drawer';
import { Empty, Failed, Loading } from '@/components/ui/states';
import type { DisplayUnit } from '@/lib/vocabulary';
import { FigureAccount } from './figure-account';
import { FigureRecords } from './figure-records';
import { figureScopePhrase, formatMeasure, MEASURE_NAMES } from './wording';

/** Pixels that the account of a figure and a page of its records take, more or less. */
const USUAL_HEIGHT = 640;

const OpenFigure = ({ figure, unit }: { figure: Figure; unit: DisplayUnit }) => {
  const { data, error, refetch } = useExplained(figure);
  if (error) return <Failed error={error} title="This figure could not be explained." onRetry={() => refetch()} />;
  if (!data) return <Loading label="Looking up how it was computed" minHeight={USUAL_HEIGHT} />;
  return (
    <>
      <FigureAccount explained={data} unit={unit} />
      {data.count === 0 ? (
        <Empty title="No record makes this figure">Nothing was recovered here, or nothing of it counts.</Empty>
      ) : (
        <FigureRecords figure={figure} unit={unit} />
      )}
    </>
  );
};

const Heading = ({ figure, unit }: { figure: Figure; unit: DisplayUnit }) => {
  const { data } = useExplained(figure);
  return (
    <>
      {/* The place of the value is held, so that nothing moves when it comes. */}
      <span className="font-mono font-medium tracking-tighter">
        {data ? formatMeasure(figure.measure, data.value, unit) : '…'}
      </span>{' '}
      <span className="text-lg font-normal tracking-normal">{MEASURE_NAMES[figure.measure].toLowerCase()}</span>
    </>
  );
};

type FigurePanelProps = { figure: Figure | null; unit: DisplayUnit; onClose: () => void };

/** What one figure is made of: how it is computed, what was left out, how fresh it is, and its records. */
export const FigurePanel = ({ figure, unit, onClose }: FigurePanelProps) => {
  // While it closes it still shows what it showed.
  const [last, setLast] = useState(figure);
  if (figure && figure !== last) setLast(figure);
  const shown = figure ?? last;
  if (!shown) return null;
  return (
    <Drawer
      open={figure !== null}
      onClose={onClose}
      title={<Heading figure={shown} unit={unit} />}
      description={figureScopePhrase(shown.scope)}
    >
      <OpenFigure key={JSON.stringify(shown)} figure={shown} unit={unit} />
    </Drawer>
  );
};
