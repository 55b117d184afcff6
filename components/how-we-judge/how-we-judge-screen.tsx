import { PageHead } from '@/components/ui/page-head';
import { CertaintySection } from './certainty-section';
import { DecisionsSection } from './decisions-section';
import { LEAK_TOPICS } from './leak-topics';
import { LowSection } from './low-section';
import { PRACTICE_RULES } from './practice-rules';
import { RulesSection } from './rules-section';
import { SLIP_RULES } from './slip-rules';
import { TECHNICIAN_TOPICS } from './technician-topics';
import { TopicsSection } from './topics-section';

/** How records are judged, in plain words: each rule, what it looks at, what it does not mean, and its source. */
export const HowWeJudgeScreen = () => (
  <div className="flex flex-col gap-6">
    <PageHead
      title="Records are judged by what like jobs gave, and by what scales and gauges can tell."
      sub="A flag is a reason to look, not a finding. It never says that somebody did something wrong, and never that a step was safe: local codes and licensed practice decide."
    />
    <CertaintySection />
    <LowSection />
    <RulesSection id="slips" title="Slips of the pen and of the scale" rules={SLIP_RULES} />
    <RulesSection id="practice" title="How the pull was done" rules={PRACTICE_RULES} />
    <DecisionsSection />
    <TopicsSection id="technicians" title="How technicians are compared" topics={TECHNICIAN_TOPICS} />
    <TopicsSection id="leaks" title="Systems that leak" topics={LEAK_TOPICS} />
  </div>
);
