import { contentId, type Recipe } from '../blending/index.ts';
import type { Issued } from './persist/envelope.ts';

/** As much of the workspace as a sheet's identity depends on. */
export interface Issuable {
  readonly recipe: Recipe;
  readonly issued: Issued | null;
}

/** Content id and revision that a sheet printed now would carry. */
export function sheetIdentity({ recipe, issued }: Issuable): Issued {
  const content = contentId(recipe);
  if (issued === null) return { revision: 1, contentId: content };
  return { revision: issued.contentId === content ? issued.revision : issued.revision + 1, contentId: content };
}

/**
 * Revision that a sheet printed now would carry: 1 for the first, the same while
 * the content is what was last issued, one more once it differs.
 */
export function sheetRevision(state: Issuable): number {
  return sheetIdentity(state).revision;
}
