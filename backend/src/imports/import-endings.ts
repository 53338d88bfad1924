/** Somebody cancelled the work on an import. */
export class ImportCancelled extends Error {}

/** The server stops, and the work on an import with it. */
export class ImportInterrupted extends Error {}
