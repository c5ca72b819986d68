import { contentId, decodeRecipeFile, planRecipe, recipeSentence } from '../blending/index.ts';
import type { CommandAnswer } from './run.ts';
import { readFlags } from './flags.ts';
import { planJson } from './plan-json.ts';

/** An exported recipe → its plan as JSON; exit 1 and a reason when it cannot be planned. */
export function planCommand(input: string, flags: readonly string[]): CommandAnswer {
  const gasConstant = readFlags(flags);
  if (!gasConstant.ok) return refused(gasConstant.reason, 2);
  const file = decodeRecipeFile(input);
  if (!file.ok) return refused(file.reason, 1);
  const { recipe } = file.value;
  const answer = planRecipe(recipe, { gasConstant: gasConstant.value });
  if (!answer.ok) {
    const problems = answer.reason.problems.map((problem) => ({ ...problem, message: recipeSentence(problem) }));
    return refused({ code: answer.reason.code, problems }, 1);
  }
  return { output: JSON.stringify(planJson(answer.value, contentId(recipe)), null, 2), exitCode: 0 };
}

function refused(reason: object, exitCode: 1 | 2): CommandAnswer {
  return { output: JSON.stringify({ ok: false, reason }, null, 2), exitCode };
}
