const MAX_ID = 4_294_967_295;

/** The number of an id in an address, or null where the text can't be one. */
export function readId(text: string): number | null {
  const id = /^[1-9]\d{0,9}$/.test(text) ? Number(text) : Infinity;
  return id <= MAX_ID ? id : null;
}
