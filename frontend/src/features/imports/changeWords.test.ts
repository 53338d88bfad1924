import { OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { describe, expect, it } from 'vitest';
import { changeWords } from './changeWords';

const words = (field: string, old: string | number | null, next: string | number | null) =>
  changeWords(OP_AMP_CATALOGUE, { field, old, new: next });

describe('the words of a change', () => {
  it('say the unit once where it is the same', () => {
    expect(words('amplifier.currentNoise', 1.2e-12, 1.4e-12)).toEqual({
      label: 'current noise',
      old: '1.2',
      next: '1.4\u2009pA/√Hz',
    });
  });

  it('say both units where the prefix changes', () => {
    expect(words('amplifier.currentNoise', 1e-12, 1e-15)).toMatchObject({
      old: '1\u2009pA/√Hz',
      next: '1\u2009fA/√Hz',
    });
  });

  it('have as many digits as tell the figures apart', () => {
    expect(words('amplifier.voltageNoise', 1.20003e-9, 1.20004e-9)).toMatchObject({
      old: '1.20003',
      next: '1.20004\u2009nV/√Hz',
    });
    expect(words('amplifier.voltageNoise', 1.2000353530145887e-9, 1.3e-9)).toMatchObject({ old: '1.2' });
  });

  it('call choices and origins what the pages call them', () => {
    expect(words('lifecycle', 'active', 'last-time-buy')).toMatchObject({ next: 'last-time buy' });
    expect(words('origins.voltageNoise', null, 'measured')).toEqual({
      label: 'voltage noise, origin',
      old: 'data sheet, typical',
      next: 'measured',
    });
    expect(words('amplifier.inputBiasCurrent', null, 1e-9)).toMatchObject({ old: 'unknown' });
    expect(words('package', '', 'SOIC-8')).toMatchObject({ old: 'none', next: 'SOIC-8' });
  });
});
