import { formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { EvidenceByRule, LowEvidence } from '../judgement';
import { massText, peersSentence, sentences, vacuumText } from './figures';

const pulled = ({ recoveredMassKg, fullChargeKg }: LowEvidence, unit: DisplayUnit): string =>
  `${massText(recoveredMassKg, unit)} of ${massText(fullChargeKg, unit)} came out (${formatPercent(recoveredMassKg / fullChargeKg)}).`;

const vacuum = ({ vacuum: read }: LowEvidence): string =>
  read ? `The final vacuum was ${vacuumText(read.kpaAbs)}; ${vacuumText(read.usualKpaAbs)} is usual.` : '';

export const explainStoppedEarly = (evidence: EvidenceByRule['stopped_early'], unit: DisplayUnit): string =>
  sentences(
    pulled(evidence, unit),
    vacuum(evidence),
    peersSentence(evidence.peers),
    'A low recovery with a shallow vacuum: the job may have stopped early.',
    `About ${formatPercent(evidence.share)} of this technician’s other pulls look like that, which is part of how sure this is.`,
  );

export const explainShortOnArrival = (evidence: LowEvidence, unit: DisplayUnit): string =>
  sentences(
    pulled(evidence, unit),
    vacuum(evidence),
    peersSentence(evidence.peers),
    'A low recovery with a normal vacuum: the unit probably arrived short. A leak note would say so.',
  );

export const explainLowUnexplained = (evidence: LowEvidence, unit: DisplayUnit): string =>
  sentences(
    pulled(evidence, unit),
    vacuum(evidence),
    peersSentence(evidence.peers),
    evidence.recoveredMassKg === 0
      ? 'The unit was empty, or the mass was not written down.'
      : 'Unusually low for this kind of job; without a final vacuum nothing says why.',
  );
