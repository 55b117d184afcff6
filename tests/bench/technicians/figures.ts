import { type Called, classOf, type Planted, Tally, trueEffect } from './tally';

/** A crew as it was judged, beside what was planted in it. */
export type JudgedCrew = { called: readonly Called[]; planted: readonly Planted[] };

/** Every simulated company has records of so many years. */
const YEARS = 12;

const isPoor = ({ class: of }: Planted): boolean => of.startsWith('bad_');

/** How each class of technician fared, and how often somebody was called below without cause. */
export const crewFigures = (crews: readonly JudgedCrew[]) => {
  const tallies = new Map<string, Tally>();
  const accused = { sound: 0, wrongly: 0, whereNobodyIsPoor: 0, crewsWhereNobodyIsPoor: 0 };
  for (const { called, planted } of crews) {
    const anyPoor = planted.some(isPoor);
    accused.crewsWhereNobodyIsPoor += Number(!anyPoor);
    for (const own of planted) {
      const said = called.find(({ name }) => name === own.name);
      if (!said) continue;
      const name = classOf(own);
      const tally = tallies.get(name) ?? new Tally();
      tallies.set(name, tally);
      tally.add(said, trueEffect(own, planted));
      if (isPoor(own)) continue;
      accused.sound += 1;
      accused.wrongly += Number(said.verdict === 'below');
      accused.whereNobodyIsPoor += Number(said.verdict === 'below' && !anyPoor);
    }
  }
  return {
    classes: Object.fromEntries([...tallies].map(([name, tally]) => [name, { ...tally }])),
    accused: { ...accused, crews: crews.length, perCrewAndYear: accused.wrongly / crews.length / YEARS },
  };
};
export type CrewFigures = ReturnType<typeof crewFigures>;

const percent = (part: number, of: number): string => (of > 0 ? `${((100 * part) / of).toFixed(1)} %` : '');

/** Prints one line a class, and one on who was called below without cause. */
export const printCrews = (title: string, { classes, accused }: CrewFigures): void => {
  console.log(`\n## ${title}`);
  console.table(
    Object.fromEntries(
      Object.entries(classes).map(([name, own]) => [
        name,
        {
          technicians: own.technicians,
          'too few': own.tooFew,
          below: own.below,
          'below, share': percent(own.below, own.technicians),
          above: own.above,
          look: own.look,
          'called a scale': own.scale,
          'range holds': percent(own.covered, own.judged),
        },
      ]),
    ),
  );
  console.log(
    `Called below without cause: ${accused.wrongly} of ${accused.sound} technicians; ${accused.whereNobodyIsPoor} in ${accused.crewsWhereNobodyIsPoor} crews without a poor technician; ${accused.perCrewAndYear.toFixed(4)} a crew and year`,
  );
};
