import { describe, expect, it } from 'vitest';
import { freshKey, patchKey, patchWords, replaceAt, replaceKeyed } from '../../src/state/command.ts';

const words = { typed: 'pressure', unit: 'unit', extra: 'extra', more: 'more' };

describe('patchWords', () => {
  it('names the touched fields, or counts them when they are many', () => {
    expect(patchWords({ typed: 'x' }, words)).toBe('pressure');
    expect(patchWords({ typed: 'x', unit: 'y' }, words)).toBe('pressure and unit');
    expect(patchWords({ typed: '', unit: '', extra: '', more: '' }, words)).toBe('4 fields');
  });
});

describe('patchKey', () => {
  it('depends on place and fields, not on values or their order', () => {
    expect(patchKey('gauge.g1', { unit: 'bar', typed: '1' })).toBe(patchKey('gauge.g1', { typed: '2', unit: 'psi' }));
    expect(patchKey('gauge.g1', { unit: 'bar' })).not.toBe(patchKey('gauge.g2', { unit: 'bar' }));
    expect(patchKey('gauge.g1', { unit: 'bar' })).not.toBe(patchKey('gauge.g1', { typed: 'bar' }));
  });
});

describe('freshKey', () => {
  it('is above every number in use, whatever else the keys are', () => {
    expect(freshKey([], 'p')).toBe('p1');
    expect(freshKey([{ key: 'p7' }, { key: 'p2' }, { key: 'nitrogen' }, { key: 'pure' }, { key: 'g9' }], 'p')).toBe('p8');
  });
});

describe('replacing', () => {
  it('changes one item and nothing when it is not there', () => {
    expect(replaceAt(['a', 'b'], 1, (item) => item + item)).toEqual(['a', 'bb']);
    expect(replaceAt(['a', 'b'], 2, (item) => item + item)).toEqual(['a', 'b']);
    const list = [{ key: 'a', value: 1 }, { key: 'b', value: 2 }];
    expect(replaceKeyed(list, 'b', (item) => ({ ...item, value: 3 }))).toEqual([{ key: 'a', value: 1 }, { key: 'b', value: 3 }]);
    expect(replaceKeyed(list, 'c', (item) => ({ ...item, value: 3 }))).toEqual(list);
  });
});
