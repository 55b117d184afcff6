import type { Called } from '../technicians/tally';
import type { JudgedCompany } from './score';

type Company = JudgedCompany & { called: readonly Called[] };

const byPlace = ({ flags }: JudgedCompany) =>
  new Map(flags.map(({ recordId, rule, certainty }) => [`${recordId} ${rule}`, certainty]));
const said = ({ verdict, look, hasScale }: Called): string => `${verdict} ${look} ${hasScale}`;

/** What the way through import and API says otherwise than the same code on the file: nothing, if no figure is lost on it. */
export const disagreement = (pairs: readonly { imported: Company; pure: Company }[]) => {
  const all = { onlyImported: 0, onlyPure: 0, refusedOtherwise: 0, technicians: 0, certainty: 0 };
  for (const { imported, pure } of pairs) {
    const [theirs, ours] = [byPlace(imported), byPlace(pure)];
    for (const [place, certainty] of theirs) {
      const other = ours.get(place);
      if (other === undefined) all.onlyImported += 1;
      else all.certainty = Math.max(all.certainty, Math.abs(certainty - other));
    }
    all.onlyPure += [...ours.keys()].filter((place) => !theirs.has(place)).length;
    all.refusedOtherwise += Number(imported.refused.toSorted().join() !== pure.refused.toSorted().join());
    const called = new Map(pure.called.map((own) => [own.name, said(own)]));
    all.technicians += imported.called.filter((own) => called.get(own.name) !== said(own)).length;
  }
  return {
    flagsOnlyImported: all.onlyImported,
    flagsOnlyFromFile: all.onlyPure,
    companiesRefusingOtherwise: all.refusedOtherwise,
    techniciansCalledOtherwise: all.technicians,
    largestDifferenceOfCertainty: Number(all.certainty.toFixed(4)),
  };
};
