/** What the paper shows: the fill sheet unless something else asked to be printed. */
export type Printed = 'sheet' | 'proof';

/** Opens the print dialogue for one of them; the style sheet looks at the mark on the body. */
export function printPage(what: Printed): void {
  document.body.dataset.prints = what;
  // A print by the browser's own menu is of the sheet again.
  window.addEventListener('afterprint', () => { delete document.body.dataset.prints; }, { once: true });
  window.print();
}

/** What is on the paper at this moment, asked while a print is under way. */
export function printedNow(): Printed {
  return document.body.dataset.prints === 'proof' ? 'proof' : 'sheet';
}
