/** What makes a name the same name however its letters are cased. */
export function nameKey(name: string): string {
  return name.toUpperCase().toLowerCase().normalize('NFC');
}
