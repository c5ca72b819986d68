/** The program's version from package.json, put in by the build. */
declare const __PROGRAM_VERSION__: string;
