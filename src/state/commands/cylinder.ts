import type { Contents, Cylinder } from '../../blending/index.ts';
import { patchKey, patchWords, type Command } from '../command.ts';

const cylinderWords = {
  id: 'cylinder name',
  material: 'cylinder material',
  waterCapacity: 'water capacity',
  workingPressure: 'working pressure',
  workingPressureTemperature: 'working pressure temperature',
  testPressure: 'test pressure',
  pressureExpansion: 'expansion with pressure',
  thermalExpansion: 'expansion with temperature',
  startReading: 'start reading',
  testDue: 'next test',
  valveOutlet: 'valve outlet',
  held: 'gases held',
  conditionedFor: 'conditioning',
  contents: 'cylinder contents',
};
const contentsWords = {
  state: 'cylinder contents',
  pressure: 'contents pressure',
  temperature: 'contents temperature',
  composition: 'contents composition',
};

/** Changes fields of the cylinder; its contents have their own command. */
export function editCylinder(patch: Partial<Omit<Cylinder, 'contents'>>): Command {
  return {
    label: () => patchWords(patch, cylinderWords),
    merge: patchKey('cylinder', patch),
    apply: (recipe) => ({ ...recipe, cylinder: { ...recipe.cylinder, ...patch } }),
  };
}

/** Changes what is said to be in the cylinder before the first addition. */
export function editContents(patch: Partial<Contents>): Command {
  return {
    label: () => patchWords(patch, contentsWords),
    merge: patchKey('contents', patch),
    apply: (recipe) => ({
      ...recipe,
      cylinder: { ...recipe.cylinder, contents: { ...recipe.cylinder.contents, ...patch } },
    }),
  };
}
