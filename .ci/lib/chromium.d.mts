/** Path of a Chromium to drive, or undefined when this machine has none. */
export function findChromium(): string | undefined;

/** Path of poppler's pdftotext, or undefined when this machine has none. */
export function findPdftotext(): string | undefined;

/** What to launch a browser with. */
export function launchOptions(): { executablePath: string | undefined; args: string[] };
