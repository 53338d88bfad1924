/** What was read from a text, or in words what was expected instead. */
export type Reading<Value> = { ok: true; value: Value } | { ok: false; message: string };
