/** A key, or two one after the other, and what it goes to. */
export interface Shortcut {
  keys: string;
  label: string;
  /** Selector of what gets the focus. */
  target: string;
}

const field = (path: string) => `[id="${path}"]`;

export const SHORTCUTS: readonly Shortcut[] = [
  { keys: '/', label: 'Search the parts', target: '#part-search' },
  { keys: 'g n', label: 'Named conditions', target: '#named-conditions' },
  { keys: 'g s', label: 'Source resistance', target: field('conditions.source.resistance') },
  { keys: 'g b', label: 'Band', target: field('conditions.band.lower') },
  { keys: 'g t', label: 'Target', target: field('target.inputNoiseRms') },
  {
    keys: 'g r',
    label: 'Ranking, at the selected part',
    target: '#ranking',
  },
  { keys: 'g e', label: 'Parts left out', target: '#exclusions' },
  { keys: 'g p', label: 'Picture', target: '#picture [role="tab"][aria-selected="true"]' },
];

/** What works inside fields and grid. */
export const LOCAL_KEYS: readonly { keys: string; label: string }[] = [
  { keys: 'Enter', label: 'Take the value that was typed' },
  { keys: 'Esc', label: 'Give the typed value up' },
  { keys: '↑ ↓', label: 'In a field: the next value of the E12 series; in the ranking: the next part' },
  { keys: '?', label: 'These shortcuts' },
];

/** What a key pressed after another means: a shortcut, the first key of one, or nothing. */
export function readKey(before: string | null, key: string): { shortcut?: Shortcut; pending: string | null } {
  const keys = before === null ? key : `${before} ${key}`;
  const shortcut = SHORTCUTS.find((known) => known.keys === keys);
  if (shortcut) return { shortcut, pending: null };
  const begins = SHORTCUTS.some((known) => known.keys.startsWith(`${key} `));
  return { pending: begins ? key : null };
}
