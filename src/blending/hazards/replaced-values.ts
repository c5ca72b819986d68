import { replacedWords } from '../messages/hazards/replaced.ts';
import type { Finding } from './finding.ts';
import type { HazardContext, HazardRule } from './rule.ts';
import type { LaboratoryValues, OwnValue } from '../values/value.ts';

/** Values that remember which of them were asked for. */
class AskedValues extends Map<string, OwnValue> {
  readonly asked = new Map<string, OwnValue>();

  override get(id: string): OwnValue | undefined {
    const own = super.get(id);
    if (own !== undefined) this.asked.set(id, own);
    return own;
  }
}

/**
 * What a rule finds, each finding with the laboratory's own values that the rule
 * asked for. A rule asks for the figures of all gases of the job, so a mark means
 * that the value had a say, not that it changed the verdict.
 */
export function judgeMarked(rule: HazardRule, context: HazardContext): readonly Finding[] {
  const { job } = context.plan;
  if (job.values.size === 0) return rule.judge(context);
  const values = new AskedValues(job.values);
  const findings = rule.judge({ ...context, plan: { ...context.plan, job: { ...job, values } } });
  return values.asked.size === 0 ? findings : findings.map((finding) => mark(finding, values.asked));
}

function mark(finding: Finding, asked: LaboratoryValues): Finding {
  const replaced = [...asked.keys()];
  return { ...finding, replaced, source: `${finding.source}; ${replacedWords([...asked])}` };
}
