import { loadCalculations } from '../blending/index.ts';
import type { Calculated, CalculationName, Calculations, Calculator } from '../blending/index.ts';
import { makeWorker } from './make-worker.ts';
import type { WorkerLike } from './make-worker.ts';

/** Whoever waits for an answer. */
type Report = (result: Calculated<CalculationName>) => void;

/** One question and all who asked it. */
interface Question {
  readonly name: CalculationName;
  readonly input: Calculations[CalculationName]['input'];
  readonly reports: Set<Report>;
}

/** Answers a question on the page's own thread, after it has had a turn. */
export type AnswerHere = (name: CalculationName, input: Calculations[CalculationName]['input']) => Promise<Calculations[CalculationName]['answer']>;

const answerOnPage: AnswerHere = async (name, input) => {
  const { calculate } = await loadCalculations();
  await new Promise<void>((resolve) => { setTimeout(resolve); });
  return calculate(name, input);
};

/**
 * Works questions out one after another on one worker, which is kept. A
 * question that a newer one of its kind overtakes before its turn is dropped;
 * one about the very same input is worked out once for all who asked.
 * Where there is no worker, or it breaks down, the page's own thread answers.
 */
export function calculator(make: () => WorkerLike | null = makeWorker, here: AnswerHere = answerOnPage): Calculator {
  /** null: not made yet. */
  let worker: WorkerLike | null = null;
  let workerRefused = false;
  let running: Question | null = null;
  const waiting = new Map<CalculationName, Question>();

  const finish = (question: Question, result: Calculated<CalculationName>): void => {
    running = null;
    for (const report of [...question.reports]) report(result);
    next();
  };
  const onPage = (question: Question): void => {
    here(question.name, question.input).then(
      (answer) => { finish(question, { kind: 'answer', answer }); },
      (error: unknown) => { finish(question, { kind: 'failed', message: error instanceof Error ? error.message : String(error) }); },
    );
  };
  const next = (): void => {
    if (running !== null) return;
    const [question] = waiting.values();
    if (question === undefined) return;
    waiting.delete(question.name);
    running = question;
    if (!workerRefused) worker ??= make();
    if (worker === null) {
      workerRefused = true;
      onPage(question);
      return;
    }
    const at = worker;
    at.onmessage = ({ data }) => {
      if (data.kind === 'calculated') finish(question, { kind: 'answer', answer: data.answer });
      else if (data.kind === 'failed') finish(question, data);
    };
    at.onerror = (event) => {
      event.preventDefault?.();
      at.terminate();
      worker = null;
      workerRefused = true;
      if (running === question) onPage(question);
    };
    at.postMessage({ kind: 'calculate', name: question.name, input: question.input } as Parameters<WorkerLike['postMessage']>[0]);
  };

  return {
    ask(name, input, report) {
      const same = [running, waiting.get(name)].find((question) => question?.name === name && question.input === input);
      const question: Question = same ?? { name, input, reports: new Set() };
      const own: Report = (result) => { report(result); };
      question.reports.add(own);
      if (question !== same) {
        waiting.set(name, question);
        next();
      }
      return () => {
        question.reports.delete(own);
        if (question.reports.size === 0 && waiting.get(name) === question) waiting.delete(name);
      };
    },
  };
}
