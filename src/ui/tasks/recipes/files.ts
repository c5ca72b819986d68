/** A text for the browser's own download; JSON unless said. */
export interface FileToHandOut {
  readonly fileName: string;
  readonly text: string;
  readonly type?: string;
}

/** Hands a file to the browser's own download. */
export function handOutFile({ fileName, text, type = 'application/json' }: FileToHandOut): void {
  const address = URL.createObjectURL(new Blob([text], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}
