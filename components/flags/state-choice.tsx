import { FLAG_STATES, type FlagState } from '@/analytics/flags/states';
import { TextButton } from '@/components/ui/button';

const NAMES: Record<FlagState, string> = { open: 'open', decided: 'decided', all: 'open and decided' };

/** Which flags the list shows, and the others to choose. */
export const StateChoice = ({ state, onChange }: { state: FlagState; onChange: (state: FlagState) => void }) => (
  <span className="inline-flex flex-wrap gap-x-3">
    {FLAG_STATES.map((one) =>
      one === state ? (
        <span key={one} className="font-medium text-ink">
          {NAMES[one]}
        </span>
      ) : (
        <TextButton key={one} className="print:hidden" onClick={() => onChange(one)}>
          {NAMES[one]}
        </TextButton>
      ),
    )}
  </span>
);
