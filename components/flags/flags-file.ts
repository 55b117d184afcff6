import type { Flag } from '@/analytics/flags/contract';
import type { ScopeSelection } from '@/analytics/scope-address';
import { figureScopePhrase } from '@/components/figures/wording';
import { type FileTable, massCell } from '@/components/files/file-table';
import { DECISION_WORDS, RULE_QUESTIONS } from '@/lib/flags/words';
import { plainCharacters } from '@/lib/format';

/** The flags for a file, one row a flag. */
export const flagsFile = (flags: readonly Flag[], scope: ScopeSelection): FileTable => ({
  title: 'Flags',
  scopeWords: plainCharacters(figureScopePhrase(scope)),
  unit: scope.unit,
  columns: [
    { label: 'Record', kind: 'text' },
    { label: 'Recovered on', kind: 'day' },
    { label: 'Technician', kind: 'text' },
    { label: 'Site', kind: 'text' },
    { label: 'Appliance', kind: 'text' },
    { label: 'Refrigerant', kind: 'text' },
    { label: 'Reason', kind: 'text' },
    { label: 'Certainty', kind: 'share' },
    { label: 'Evidence', kind: 'text' },
    { label: `Recovered, ${scope.unit}`, kind: 'mass' },
    { label: `Full charge, ${scope.unit}`, kind: 'mass' },
    { label: `Expected, ${scope.unit}`, kind: 'mass' },
    { label: 'Decision', kind: 'text' },
    { label: 'Decided by', kind: 'text' },
    { label: 'Note', kind: 'text' },
  ],
  rows: flags.map((flag) => [
    flag.recordRef,
    flag.recoveredOn,
    flag.technician,
    flag.site,
    flag.appliance,
    flag.refrigerant,
    RULE_QUESTIONS[flag.rule],
    flag.certainty,
    plainCharacters(flag.explanation),
    massCell(flag.recoveredMass, scope.unit),
    massCell(flag.fullCharge, scope.unit),
    flag.expectedMass === null ? null : massCell(flag.expectedMass, scope.unit),
    flag.decision ? DECISION_WORDS[flag.decision].name : '',
    flag.decision ? (flag.decisions[0]?.by ?? '') : '',
    (flag.decision ? flag.decisions[0]?.note : null) ?? flag.note ?? '',
  ]),
});
