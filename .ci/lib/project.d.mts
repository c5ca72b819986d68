/** The program's version, as printed on the fill sheet. */
export function programVersion(): string;
