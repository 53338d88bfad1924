import { OP_AMP_CATALOGUE, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import { describe, expect, it } from 'vitest';
import { opAmp, resistor } from '../../test/factories';
import { draftOf, emptyDraft, partOf } from './partDraft';

describe('the draft of a part', () => {
  it('begins with the defaults of its catalogue', () => {
    expect(emptyDraft(OP_AMP_CATALOGUE)).toMatchObject({
      partNumber: '',
      lifecycle: 'active',
      amplifier: { inputType: null, channels: 1, voltageNoise: null },
      origins: {},
    });
    const { resistor: figures } = emptyDraft(RESISTOR_CATALOGUE);
    expect(new Set(Object.values(figures!))).toEqual(new Set([null]));
    expect(Object.keys(figures!)).toEqual(Object.keys(resistor().resistor));
  });

  it.each([
    ['op-amp', OP_AMP_CATALOGUE, opAmp()],
    ['resistor', RESISTOR_CATALOGUE, resistor()],
  ] as const)('of an %s leaves out what the server keeps of it', (_kind, catalogue, part) => {
    const drafted = partOf(catalogue, draftOf(catalogue, part));
    expect(part).toMatchObject(drafted);
    const kept = Object.keys(part).filter((key) => !(key in drafted));
    expect(kept).toEqual(['id', 'library', 'version', 'updatedAt']);
  });

  it('loses the origin of a figure that became unknown', () => {
    const draft = draftOf(RESISTOR_CATALOGUE, resistor());
    const cleared = { ...draft, resistor: { ...draft.resistor, noiseIndex: null } };
    expect(partOf(RESISTOR_CATALOGUE, draft)).toMatchObject({ origins: { noiseIndex: 'measured' } });
    expect(partOf(RESISTOR_CATALOGUE, cleared).origins).toEqual({});
  });
});
