/**
 * What this program uses of papaparse. Its published types speak of files,
 * streams and workers and bring the types of Node with them into the pure layers.
 */
declare module 'papaparse/papaparse.min.js' {
  interface ParseError {
    readonly code: string;
    /** From 0. */
    readonly row?: number;
  }
  interface Papa {
    parse(text: string, options: { readonly delimiter: string }): { readonly data: string[][]; readonly errors: readonly ParseError[] };
    unparse(
      rows: readonly (readonly string[])[],
      options: { readonly delimiter: string; readonly newline: string; readonly escapeFormulae: RegExp },
    ): string;
  }
  const papa: Papa;
  export default papa;
}
