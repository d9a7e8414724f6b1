/** The version in package.json, written in by vite.cli.config.ts. */
declare const __VERSION__: string;
