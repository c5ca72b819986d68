import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { loadPublishedValues } from '../../../../src/blending/index.ts';
import type { LaboratoryValue, ListedValue } from '../../../../src/blending/index.ts';
import { ValueTable } from '../../../../src/ui/tasks/values/ValueTable.tsx';

const list = await loadPublishedValues();
const some = (...ids: readonly string[]): readonly ListedValue[] => list.filter(({ id }) => ids.includes(id));

function drawn(values: readonly ListedValue[], own: readonly LaboratoryValue[] = []): string {
  return renderToStaticMarkup(<ValueTable section="s" values={values} own={own} onSet={() => undefined} onPutBack={() => undefined} />);
}

/** The text of each row, without its tags. */
const rows = (html: string): readonly string[] => html.split('<tr>').slice(2).map((row) => row.replace(/<[^>]*>/gu, ' ').replace(/\s+/gu, ' ').trim());

describe('a row of the list of values', () => {
  it('stands under its quantity with gas, published value, source and trust', () => {
    // Published: IEC 60079-20-1 and NFPA 497 for the limit; Tci of carbon monoxide from memory.
    const [heading, methane] = rows(drawn(some('lfl:methane')));
    expect(heading).toBe('Lower flammable limit in air');
    expect(methane).toBe('CH₄ methane 4.4 % IEC 60079-20-1:2010 and NFPA 497 (2008), in air at atmospheric pressure seen Replace…');
    expect(drawn(some('tci:carbon monoxide'))).toContain('<td class="unsure">from memory</td>');
  });

  it('shows a threshold in one row, shortened to what can be read, and a missing figure as such', () => {
    expect(rows(drawn(some('settled-share-of-test-pressure')))[0]).toContain('0.6667 UN Model Regulations');
    expect(rows(drawn(some('lc50:benzene')))[1]).toContain('none found');
  });

  it('marks by word what is replaced, and offers to put it back', () => {
    const [, methane, ethane] = rows(drawn(some('lfl:methane', 'lfl:ethane'), [{ id: 'lfl:methane', value: '5,0', source: 'own copy', date: '2026-12-01' }]));
    expect(methane).toContain('own value 5,0 % own copy, 2026-12-01 Change… Put back');
    expect(ethane).not.toContain('own value');
  });
});
