import type { ExportedFile } from '../../../state/index.ts';

/** Hands a file to the browser's own download. */
export function handOutFile({ fileName, text }: ExportedFile): void {
  const address = URL.createObjectURL(new Blob([text], { type: 'application/json' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}
