/** What is wrong with one field of a recipe. */
export type FieldFault = 'missing' | 'unknown' | 'wrong-type' | 'not-an-option' | 'too-long' | 'too-many';

/** Why a text is not taken as a recipe file. */
export type FileProblem =
  | { readonly code: 'too-large'; readonly characters: number; readonly limit: number }
  /** `detail` is the reader's own words on where it stopped. */
  | { readonly code: 'not-json'; readonly detail: string }
  | { readonly code: 'not-a-recipe-file' }
  | { readonly code: 'newer-version'; readonly version: number; readonly newest: number }
  /** An old version that this program has no step from. */
  | { readonly code: 'no-migration'; readonly version: number }
  | {
      readonly code: 'field-invalid';
      /** Where, like `recipe.parents[0].key`; empty: the whole file. */
      readonly path: string;
      readonly fault: FieldFault;
      /** What would have been taken, in the schema's words. */
      readonly expected: string;
      readonly received: string;
    };
