import { YieldStrip } from '@/components/flags/yield-strip';
import { Term } from '@/components/glossary/term';
import { Sheet } from '@/components/ui/sheet';
import { RULE_QUESTIONS } from '@/lib/flags/words';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';

/** Low recoveries: three questions out of a yield and a vacuum, and how to read the little picture. */
export const LowSection = () => (
  <Sheet title="Low recoveries">
    <div className="grid gap-x-10 gap-y-4 md:grid-cols-2">
      <div className="max-w-prose space-y-3">
        <p>
          A pull is laid beside jobs of the same category of appliance and the same job type, of the last three years
          and of other people, so that nobody is his own yardstick. Where fewer than {LEAST_LIKE_JOBS} are alike, the
          group is widened, and where that is not enough nothing is said. It is low when its{' '}
          <Term id="yield">yield</Term> lies more than one and a half times the middle half’s width below the lower{' '}
          <Term id="quartiles">quartile</Term>.
        </p>
        <p>
          What a low yield means, the <Term id="final-vacuum">final vacuum</Term> tells:
        </p>
        <ul className="space-y-2">
          <li>
            <span className="font-semibold">{RULE_QUESTIONS.stopped_early}</span> Low, and the vacuum shallow: the job
            may have ended before the system was empty. How often this person’s pulls look so is part of how sure it is.
          </li>
          <li>
            <span className="font-semibold">{RULE_QUESTIONS.short_on_arrival}</span> Low, and the vacuum as usual: the
            system had probably lost its charge before. That is no fault; a leak note would say so.
          </li>
          <li>
            <span className="font-semibold">{RULE_QUESTIONS.low_unexplained}</span> Low, and no vacuum written down:
            nothing can tell the two apart. Most of these are ordinary leaks.
          </li>
        </ul>
      </div>
      <div className="max-w-prose space-y-3">
        <YieldStrip yield={0.22} lowerQuartile={0.78} medianYield={0.86} upperQuartile={0.93} lowerFence={0.555} />
        <p>
          The line runs from nothing to the full charge. The box holds the middle half of the like jobs, the stroke in
          it is their median, the dashes are the fence, and the dot is this recovery.
        </p>
        <p className="text-ink-2">
          A leaking system is not a bad technician. Pulls from systems that were short, or known to hold little, do not
          count when people are compared, once somebody has decided so.
        </p>
        <p className="text-sm text-ink-3">
          The fence is that of J. W. Tukey, Exploratory Data Analysis, Addison-Wesley 1977, chapter 2. Quartiles hold
          still when a quarter of the records is wrong; a mean would not.
        </p>
      </div>
    </div>
  </Sheet>
);
