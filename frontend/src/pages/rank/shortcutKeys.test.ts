import { describe, expect, it } from 'vitest';
import { readKey, SHORTCUTS } from './shortcutKeys';

describe('shortcuts', () => {
  it('are single keys or two keys one after the other', () => {
    expect(readKey(null, '/').shortcut?.target).toBe('#part-search');
    expect(readKey(null, 'g')).toEqual({ pending: 'g' });
    expect(readKey('g', 'r').shortcut?.label).toContain('Ranking');
  });

  it('begin anew after a key that leads nowhere', () => {
    expect(readKey('g', 'x')).toEqual({ pending: null });
    expect(readKey('g', 'g')).toEqual({ pending: 'g' });
    expect(readKey(null, 'r').shortcut).toBeUndefined();
  });

  it('each have keys of their own', () => {
    expect(new Set(SHORTCUTS.map(({ keys }) => keys)).size).toBe(SHORTCUTS.length);
  });
});
