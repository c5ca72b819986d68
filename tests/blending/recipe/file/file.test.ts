import { describe, expect, it } from 'vitest';
import { defaultConditions, emptyRecipe } from '../../../../src/blending/recipe/defaults.ts';
import type { Recipe } from '../../../../src/blending/recipe/document.ts';
import {
  decodeRecipeFile, encodeRecipeFile, fileProblemSentence, largestRecipeFile, recipeBounds, recipeFault,
} from '../../../../src/blending/recipe/file/file.ts';
import { example, exampleText, withLeaf, type Path } from './example.ts';

function problem(document: unknown) {
  const read = decodeRecipeFile(typeof document === 'string' ? document : JSON.stringify(document));
  if (read.ok) throw new Error('was read');
  return read.reason;
}

function damaged(path: Path, leaf: unknown) {
  return problem(withLeaf(example(), path, leaf));
}

describe('encodeRecipeFile', () => {
  it('is read back as the same recipe, with version and program', () => {
    const read = decodeRecipeFile(encodeRecipeFile(emptyRecipe, 'fillwright 0.1.0'));
    expect(read).toEqual({ ok: true, value: { recipe: emptyRecipe, version: 2, program: 'fillwright 0.1.0' } });
  });

  it('is indented JSON that ends with a newline', () => {
    expect(encodeRecipeFile(emptyRecipe, 'x')).toMatch(/^\{\n {2}"format": "fillwright-recipe",\n {2}"version": 2,\n[^]*\}\n$/);
  });

  it('can be read back at the bounds of every list and text, however it is escaped', () => {
    const text = '\u0001'.repeat(recipeBounds.shortText);
    const long = '\u0001'.repeat(recipeBounds.longText);
    const pressure = { typed: text, reference: 'gauge' } as const;
    const forty = <Item>(item: Item) => Array.from({ length: recipeBounds.lines }, () => item);
    const composition = forty({ gas: text, amount: text, uncertainty: text, basis: 'typical' as const });
    const largest: Recipe = {
      ...emptyRecipe,
      name: text,
      note: long,
      order: { ...emptyRecipe.order, components: forty({ gas: text, amount: text, tolerance: text }) },
      parents: forty({
        key: text, name: text, composition, pressure, temperature: text, waterCapacity: text, filling: 'liquefied' as const,
        contentMass: text, lot: text, expiry: text, location: text, stock: text,
      }),
      conditioning: forty({ kind: 'purge' as const, parent: text, low: pressure, high: pressure, cycles: text, wanted: text }),
      batch: { cylinders: text, together: true, boosterInlet: pressure },
      values: Array.from({ length: 500 }, () => ({ id: text, value: text, source: text, date: text })),
      gauges: forty({
        key: text, name: text, unit: text, reference: 'gauge' as const, fullScale: text, accuracy: text, accuracyOf: 'reading' as const,
        resolution: text, calibrated: text,
      }),
      route: { ...emptyRecipe.route, steps: forty({ parent: text, gasTemperature: text, gauge: text }) },
      overrides: forty({ finding: text, figure: text, name: text, reason: long }),
    };
    expect(recipeFault(largest)).toBeNull();
    expect(decodeRecipeFile(encodeRecipeFile(largest, 'x')).ok).toBe(true);
  });
});

describe('decodeRecipeFile', () => {
  it('fills what a person left out with the defaults and keeps what was said', () => {
    const read = decodeRecipeFile(exampleText);
    if (!read.ok) throw new Error(read.reason.code);
    const { recipe, program } = read.value;
    expect(program).toBe('');
    expect(recipe.note).toBe('');
    expect(recipe.gauges).toEqual([]);
    expect(recipe.conditions).toEqual({ ...defaultConditions, barometer: '1008 hPa', coldestStorage: '-10 °C' });
    expect(recipe.cylinder.material).toBe('rigid');
    expect(recipe.cylinder.workingPressureTemperature).toBe('15 °C');
    expect(recipe.cylinder.contents).toEqual({
      state: 'evacuated', pressure: { typed: '', reference: 'absolute' }, temperature: '20 °C', composition: [],
    });
    expect(recipe.route.sequence).toBe('as listed');
    expect(recipe.route.steps).toEqual([
      { parent: 'p1', gasTemperature: '18 °C', gauge: '' },
      { parent: 'p2', gasTemperature: '24 °C', gauge: '' },
    ]);
    expect(recipe.order.components[1]).toEqual({ gas: 'nitrogen', amount: 'balance', tolerance: '' });
  });

  it('fills route and conditions that are left out altogether', () => {
    const bare = withLeaf(withLeaf(example(), ['recipe', 'route'], undefined), ['recipe', 'conditions'], undefined);
    const read = decodeRecipeFile(JSON.stringify(bare));
    expect(read.ok && read.value.recipe.route).toEqual(emptyRecipe.route);
    expect(read.ok && read.value.recipe.conditions).toEqual(defaultConditions);
  });

  it('passes over a byte-order mark', () => {
    expect(decodeRecipeFile(`\uFEFF${exampleText}`).ok).toBe(true);
  });

  it('refuses what is not JSON, with the place', () => {
    expect(problem('{"format": ').code).toBe('not-json');
    expect(problem('').code).toBe('not-json');
  });

  it.each([[null], [[]], ['"text"'], [{}], [{ format: 'other', version: 1 }]])('refuses %j as another format', (document) => {
    expect(problem(document)).toEqual({ code: 'not-a-recipe-file' });
  });

  it('refuses a newer version without looking further', () => {
    expect(problem({ format: 'fillwright-recipe', version: 3, whatever: true })).toEqual({
      code: 'newer-version', version: 3, newest: 2,
    });
  });

  it('refuses a text too large before parsing it', () => {
    expect(problem(' '.repeat(largestRecipeFile + 1))).toEqual({
      code: 'too-large', characters: largestRecipeFile + 1, limit: largestRecipeFile,
    });
  });

  it.each<[Path, unknown, string, string]>([
    [['version'], '1', 'not-an-option', 'version'],
    [['version'], 1.5, 'not-an-option', 'version'],
    [['recipe'], undefined, 'missing', 'recipe'],
    [['recipe', 'name'], undefined, 'missing', 'recipe.name'],
    [['recipe', 'order', 'fillPressure', 'reference'], undefined, 'missing', 'recipe.order.fillPressure.reference'],
    [['recipe', 'parents', 1, 'key'], undefined, 'missing', 'recipe.parents[1].key'],
    [['recipe', 'valve'], 'M25', 'unknown', 'recipe.valve'],
    [['recipe', 'cylinder', 'contents', 'presure'], {}, 'unknown', 'recipe.cylinder.contents.presure'],
    [['recipe', 'constructor'], 'x', 'unknown', 'recipe.constructor'],
    [['recipe', 'order', 'fillTemperature'], 20, 'wrong-type', 'recipe.order.fillTemperature'],
    [['recipe', 'note'], null, 'wrong-type', 'recipe.note'],
    [['recipe', 'cylinder', 'material'], 'glass', 'not-an-option', 'recipe.cylinder.material'],
    [['recipe', 'name'], 'x'.repeat(201), 'too-long', 'recipe.name'],
    [['recipe', 'parents'], Array.from({ length: 41 }, () => ({ key: 'p', composition: [] })), 'too-many', 'recipe.parents'],
  ])('names the field: %j = %j is %s at %s', (path, leaf, fault, at) => {
    expect(damaged(path, leaf)).toMatchObject({ code: 'field-invalid', fault, path: at });
  });

  it('names an own field called __proto__ as unknown', () => {
    const text = exampleText.replace('"recipe": {', '"recipe": { "__proto__": { "note": "hidden" },');
    expect(problem(text)).toMatchObject({ code: 'field-invalid', fault: 'unknown', path: 'recipe.__proto__' });
  });

  it('cuts an endless field name and value in what it reports', () => {
    const reason = damaged(['recipe', 'x'.repeat(5000)], 'y');
    expect(JSON.stringify(reason).length).toBeLessThan(400);
  });

  it('stops at the first fault of a hostile list', () => {
    const began = performance.now();
    expect(damaged(['recipe', 'parents'], Array.from({ length: 1_000_000 }, () => 0)).code).toBe('field-invalid');
    expect(performance.now() - began).toBeLessThan(2000);
  });
});

describe('fileProblemSentence', () => {
  it('names field and fault', () => {
    expect(fileProblemSentence(damaged(['recipe', 'name'], undefined))).toBe('The field "recipe.name" is missing.');
    expect(fileProblemSentence(damaged(['recipe', 'cylinder', 'material'], 'glass'))).toBe(
      'The field "recipe.cylinder.material" should be ("aluminium" or "steel" or "rigid"), not "glass".',
    );
    expect(fileProblemSentence(damaged(['recipe', 'name'], 'x'.repeat(201)))).toBe(
      'The field "recipe.name" is too long: 201 characters, at most 200.',
    );
  });
});
