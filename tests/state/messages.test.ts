import { describe, expect, it } from 'vitest';
import { actionSentence, noticeSentence, saveSentence, savedEntrySentence, type Notice } from '../../src/state/index.ts';

describe('sentences', () => {
  it('say saved only for saved', () => {
    expect(saveSentence({ kind: 'saved', at: 0 })).toBe('Saved');
    expect(saveSentence({ kind: 'pending' })).toBe('Saving…');
    expect(saveSentence({ kind: 'failed', problem: { code: 'storage-full' } })).toMatch(/^Not saved: .*full/);
  });

  const notices: readonly Notice[] = [
    { kind: 'deleted', id: 'a', name: 'Blend' },
    { kind: 'restored', id: 'a', name: '' },
    { kind: 'imported', id: 'a', name: 'Blend' },
    { kind: 'import-failed', problem: { code: 'not-a-recipe-file' } },
    { kind: 'edit-refused', problem: { code: 'field-invalid', path: 'note', fault: 'too-long', expected: '<=2000', received: '2001' } },
    { kind: 'save-failed', problem: { code: 'not-read-back' } },
    { kind: 'kept-as-copy', name: 'Blend (copy)' },
    { kind: 'changed-elsewhere', name: 'Blend' },
    { kind: 'deleted-elsewhere', name: 'Blend' },
    { kind: 'unreadable', id: 'a', problem: { code: 'entry-checksum' } },
    { kind: 'no-such-recipe', id: 'a' },
    { kind: 'would-lose-work', problem: { code: 'storage-full' } },
    { kind: 'storage-failed', problem: { code: 'storage-unavailable', detail: 'SecurityError' } },
  ];

  it('are whole and different for every notice', () => {
    const sentences = notices.map(noticeSentence);
    expect(new Set(sentences).size).toBe(notices.length);
    for (const sentence of sentences) expect(sentence).toMatch(/^[A-Z].*\.$/);
  });

  it('name the version that is too new', () => {
    expect(savedEntrySentence({ code: 'entry-newer-version', version: 4, newest: 1 })).toContain('version 4');
    expect(actionSentence({ code: 'newer-version', version: 5, newest: 1 })).toContain('version 5');
  });
});
