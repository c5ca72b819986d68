import { describe, expect, it } from 'vitest';
import { memoryRecipeStorage } from '../../../src/state/index.ts';

describe('memoryRecipeStorage', () => {
  it('tells the other windows, not the one that wrote', () => {
    const memory = memoryRecipeStorage({ a: '1' });
    const [here, there] = [memory.window(), memory.window()];
    const heard: string[] = [];
    here.subscribe((key) => heard.push(`here ${key}`));
    const stop = there.subscribe((key) => heard.push(`there ${key}`));
    here.write('b', '2');
    there.remove('a');
    there.remove('a');
    stop();
    here.write('c', '3');
    expect(heard).toEqual(['there b', 'here a']);
    expect(there.read('b')).toEqual({ ok: true, value: '2' });
    expect(here.keys()).toEqual({ ok: true, value: ['b', 'c'] });
  });
});
