import { CERTAINTY_MEANING } from '@/analytics/flags/sentence';
import { Sheet } from '@/components/ui/sheet';

/** What a certainty is and what it is good for. */
export const CertaintySection = () => (
  <Sheet title="How sure a flag is">
    <div className="grid gap-x-10 gap-y-3 md:grid-cols-2">
      <p className="max-w-prose">
        {CERTAINTY_MEANING} The surest stand first. From 50% on a record counts as flagged on the other screens, unless
        its only flag says that the system came short.
      </p>
      <p className="max-w-prose">
        Whether that holds shows itself when flags are decided: the page of flags says how many of the last fifty were
        borne out, with the range that so few can tell (Wilson, Journal of the American Statistical Association 22,
        1927).
      </p>
    </div>
  </Sheet>
);
