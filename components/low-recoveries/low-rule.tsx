import { Term } from '@/components/glossary/term';
import { Sheet } from '@/components/ui/sheet';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import { YieldStrip } from './yield-strip';

/** The rule in plain words, with its source and how to read the little picture. */
export const LowRule = () => (
  <Sheet title="How these are found">
    <div className="grid gap-x-10 gap-y-4 md:grid-cols-2">
      <div className="max-w-prose space-y-3">
        <p>
          <Term id="like-jobs">Like jobs</Term> are recoveries of the same refrigerant from the same category of
          appliance, over the company’s whole record. Put in order by yield, the middle half of them lies between the
          lower and the upper <Term id="quartiles">quartile</Term>. A recovery is listed when its yield lies more than
          one and a half times that distance below the lower quartile.
        </p>
        <p>
          Quartiles hold still even when some of the records are wrong, which a mean would not. Where fewer than{' '}
          {LEAST_LIKE_JOBS} jobs are alike, nothing is said about any of them. Entry errors are left out.
        </p>
        <p className="text-sm text-ink-2">
          The rule is the lower fence of J. W. Tukey, Exploratory Data Analysis, Addison-Wesley 1977, chapter 2.
        </p>
      </div>
      <div className="max-w-prose space-y-3">
        <YieldStrip yield={0.22} lowerQuartile={0.78} medianYield={0.86} upperQuartile={0.93} lowerFence={0.555} />
        <p>
          The line runs from nothing to the full charge. The box holds the middle half of the like jobs, the stroke in
          it is their median, the dashes are the fence, and the dot is this recovery.
        </p>
        <p>
          <Term id="yield">Yield</Term> is recovered mass over full charge, and
          <Term id="full-charge">full charge</Term> is the nameplate charge plus what was added for long lines. A system
          that leaked before anyone came, a nameplate read from the wrong unit and pounds written as ounces all look the
          same here: only the record and the person tell them apart.
        </p>
      </div>
    </div>
  </Sheet>
);
