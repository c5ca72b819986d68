import { describe, expect, it } from 'vitest';
import { emptyRecipe } from '../../src/blending/index.ts';
import type { Calculated, CalculationName, Calculations, Recipe } from '../../src/blending/index.ts';
import { calculator } from '../../src/worker/calculator.ts';
import type { AnswerHere } from '../../src/worker/calculator.ts';
import type { WorkerLike } from '../../src/worker/make-worker.ts';
import type { WorkerAnswer, WorkerRequest } from '../../src/worker/protocol.ts';

type Answer = Calculations[CalculationName]['answer'];

class MadeWorker implements WorkerLike {
  readonly requests: WorkerRequest[] = [];
  terminated = 0;
  onmessage: WorkerLike['onmessage'] = null;
  onerror: WorkerLike['onerror'] = null;
  postMessage(request: WorkerRequest): void { this.requests.push(request); }
  terminate(): void { this.terminated += 1; }
  tell(answer: WorkerAnswer): void { this.onmessage?.({ data: answer }); }
  finish(answer: Answer): void { this.tell({ kind: 'calculated', answer }); }
}

const recipe = (name: string): Recipe => ({ ...emptyRecipe, name });
/** An answer that only this question can have got. */
const answer = (missing: number): Answer => ({ ok: false, reason: { code: 'too-many-parents', parents: missing, most: 12 } });
const told = (missing: number) => ({ kind: 'answer', answer: answer(missing) });

/** A calculator over one invented worker, and everything it reports. `no worker`: the browser grants none. */
function desk(grants: 'worker' | 'no worker' = 'worker') {
  const worker = new MadeWorker();
  const made = { count: 0 };
  const onPage: { readonly name: CalculationName; readonly input: unknown; readonly end: (answer: Answer) => void; readonly breakOff: (error: unknown) => void }[] = [];
  const here: AnswerHere = (name, input) => new Promise((end, breakOff) => { onPage.push({ name, input, end, breakOff }); });
  const asker = calculator(() => {
    made.count += 1;
    return grants === 'worker' ? worker : null;
  }, here);
  const reports: (readonly [who: string, result: Calculated<CalculationName>])[] = [];
  const study = (input: Recipe, who = input.name) => asker.ask('study', input, (result) => { reports.push([who, result]); });
  const names = () => worker.requests.map((request) => (request.kind === 'calculate' && request.name === 'study' ? request.input.name : request.kind));
  return { asker, worker, made, onPage, reports, study, names };
}

/** Lets promises that are settled be told. */
const turn = () => new Promise<void>((resolve) => { setTimeout(resolve); });

describe('calculator, with a worker', () => {
  it('makes no worker before the first question, and keeps the one it made', () => {
    const { worker, made, study, reports } = desk();
    expect(made.count).toBe(0);
    study(recipe('a'));
    worker.finish(answer(1));
    study(recipe('b'));
    worker.finish(answer(2));
    expect(made.count).toBe(1);
    expect(worker.terminated).toBe(0);
    expect(reports).toEqual([['a', told(1)], ['b', told(2)]]);
  });

  it('asks one after another, each kind in its turn', () => {
    const { asker, worker, study, reports } = desk();
    study(recipe('a'));
    asker.ask('propose', { recipe: recipe('p'), stock: { parents: [], cylinders: [], gauges: [], thermometers: [], balances: [], values: [] }, today: '2026-12-01' },
      (result) => { reports.push(['p', result]); });
    study(recipe('b'));
    const asked = () => worker.requests.map((request) => (request.kind === 'calculate' ? request.name : request.kind));
    expect(asked()).toEqual(['study']);
    worker.finish(answer(1));
    expect(asked()).toEqual(['study', 'propose']);
    worker.finish(answer(2));
    expect(asked()).toEqual(['study', 'propose', 'study']);
    worker.finish(answer(3));
    expect(reports).toEqual([['a', told(1)], ['p', told(2)], ['b', told(3)]]);
  });

  it('drops what a newer question of its kind overtakes before its turn', () => {
    const { worker, study, names, reports } = desk();
    for (const name of ['a', 'b', 'c', 'd']) study(recipe(name));
    worker.finish(answer(1));
    worker.finish(answer(4));
    expect(names()).toEqual(['a', 'd']);
    expect(reports).toEqual([['a', told(1)], ['d', told(4)]]);
  });

  it('works one input out once for all who ask about it, waiting or at work', () => {
    const { worker, study, names, reports } = desk();
    const [first, next] = [recipe('a'), recipe('b')];
    study(first, 'plan');
    study(first, 'screen');
    study(next, 'plan');
    study(next, 'screen');
    worker.finish(answer(1));
    worker.finish(answer(2));
    expect(names()).toEqual(['a', 'b']);
    expect(reports).toEqual([['plan', told(1)], ['screen', told(1)], ['plan', told(2)], ['screen', told(2)]]);
  });

  it('reports nothing to who has forgotten the question, and never asks what all have forgotten', () => {
    const { worker, study, names, reports } = desk();
    const shared = recipe('a');
    const forget = study(shared, 'gone');
    study(shared, 'stayed');
    study(recipe('b'))();
    forget();
    worker.finish(answer(1));
    expect(reports).toEqual([['stayed', told(1)]]);
    expect(names()).toEqual(['a']);
    study(recipe('c'));
    expect(names()).toEqual(['a', 'c']);
  });

  it('reports work that broke off, and goes on with the next', () => {
    const { worker, made, study, reports } = desk();
    study(recipe('a'));
    study(recipe('b'));
    worker.tell({ kind: 'failed', message: 'out of memory' });
    worker.finish(answer(2));
    expect(reports).toEqual([['a', { kind: 'failed', message: 'out of memory' }], ['b', told(2)]]);
    expect(made.count).toBe(1);
  });
});

describe('calculator, where the worker is missing or breaks', () => {
  it('answers on the page where the browser grants no worker, and does not ask for one again', async () => {
    const { made, onPage, study, reports } = desk('no worker');
    study(recipe('a'));
    study(recipe('b'));
    expect(onPage.map(({ name, input }) => [name, input])).toEqual([['study', recipe('a')]]);
    onPage[0]!.end(answer(1));
    await turn();
    onPage[1]!.end(answer(2));
    await turn();
    expect(reports).toEqual([['a', told(1)], ['b', told(2)]]);
    expect(made.count).toBe(1);
  });

  it('answers the same question on the page when the worker cannot be loaded, and all later ones', async () => {
    const { worker, onPage, study, reports } = desk();
    study(recipe('a'));
    worker.onerror?.({ message: 'blocked' });
    expect(worker.terminated).toBe(1);
    onPage[0]!.end(answer(1));
    await turn();
    study(recipe('b'));
    onPage[1]!.end(answer(2));
    await turn();
    expect(reports).toEqual([['a', told(1)], ['b', told(2)]]);
    expect(worker.requests).toHaveLength(1);
  });

  it('tells nobody twice when the worker breaks between two questions', async () => {
    const { worker, onPage, study, reports } = desk();
    study(recipe('a'));
    worker.finish(answer(1));
    worker.onerror?.({ message: 'gone' });
    await turn();
    expect(onPage).toEqual([]);
    study(recipe('b'));
    onPage[0]!.end(answer(2));
    await turn();
    expect(reports).toEqual([['a', told(1)], ['b', told(2)]]);
  });

  it('says so when the page’s own thread breaks off too', async () => {
    const { onPage, study, reports } = desk('no worker');
    study(recipe('a'));
    onPage[0]!.breakOff(new Error('a chunk cannot be fetched'));
    await turn();
    expect(reports).toEqual([['a', { kind: 'failed', message: 'a chunk cannot be fetched' }]]);
  });

  it('answers with the real calculations when nothing else is handed in', async () => {
    const result = await new Promise<Calculated<'study'>>((resolve) => { calculator(() => null).ask('study', emptyRecipe, resolve); });
    expect(result).toEqual({ kind: 'answer', answer: { ok: false, reason: { code: 'not-planned' } } });
  });
});
