import { checkConditions, STAGE_FIELDS } from '@roothertz/common/conditions';
import { CONTRIBUTORS, evaluateStage, type Contributions } from '@roothertz/common/noise';
import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { sharesOf } from '../../../components/charts/shares';
import { opAmp } from '../../../test/factories';
import { ConditionsContext } from '../ConditionsContext';
import { exampleRequest } from '../exampleRequest';
import { STAGE_KINDS, type StageKind } from '../stageKind';
import { discRadius, WHOLE_RADIUS } from './discRadius';
import { LAYOUTS } from './layouts';
import { SCHEMATIC_WIDTH } from './layout';
import { Schematic } from './Schematic';

const none = Object.fromEntries(CONTRIBUTORS.map((contributor) => [contributor, 0])) as Contributions;

function show(kind: StageKind, shares: Contributions | null) {
  const request = exampleRequest(kind);
  const form = {
    request,
    messages: new Map(),
    change: () => undefined,
    replace: () => undefined,
    reportDraft: () => undefined,
  };
  return render(
    <ConditionsContext value={form}>
      <Schematic shares={shares} />
    </ConditionsContext>,
  );
}

const disc = (container: HTMLElement, contributor: string) =>
  container.querySelector(`circle[data-contributor="${contributor}"]`);

describe('the schematic', () => {
  it('draws each generator’s disc with its area as its share', () => {
    const { container } = show('non-inverting', {
      ...none,
      source: 0.64,
      amplifierVoltage: 0.16,
      feedback: 0.2,
    });
    expect(Number(disc(container, 'source')!.getAttribute('r'))).toBeCloseTo(0.8 * WHOLE_RADIUS);
    expect(Number(disc(container, 'amplifierVoltage')!.getAttribute('r'))).toBeCloseTo(0.4 * WHOLE_RADIUS);
    expect(disc(container, 'bias')).toBeNull();
    expect(container.querySelector('svg')).toHaveTextContent(/64\s%/);
  });

  it('draws no disc where nothing is selected', () => {
    expect(show('inverting', null).container.querySelector('[data-contributor]')).toBeNull();
  });

  it.each(STAGE_KINDS)('has a field for every value of a %s stage', (kind) => {
    const { stage } = exampleRequest(kind).conditions;
    const { required, optional } = STAGE_FIELDS[stage.topology];
    const onList = ['network', 'outputVoltage', 'gainNoiseIndex', 'feedbackNoiseIndex'];
    const fields = kind === 'follower' ? ['loadResistance'] : [...required, ...optional];
    const drawn = LAYOUTS[kind].values.map(({ field }) => field as string);
    expect(drawn).toEqual(
      expect.arrayContaining(
        fields.filter((field) => !onList.includes(field)).map((field) => `conditions.stage.${field}`),
      ),
    );
  });

  it.each(STAGE_KINDS)('has a disc for every generator that a %s stage has', (kind) => {
    const { conditions } = exampleRequest(kind);
    expect(checkConditions({ conditions })).toEqual([]);
    const { contributions } = evaluateStage(conditions, opAmp().amplifier);
    const making = CONTRIBUTORS.filter((contributor) => sharesOf(contributions)[contributor] > 0);
    expect(LAYOUTS[kind].discs.map(({ contributor }) => contributor)).toEqual(expect.arrayContaining(making));
  });

  it.each(STAGE_KINDS)('keeps every value and disc of a %s stage on its sheet', (kind) => {
    const { height, values, discs } = LAYOUTS[kind];
    for (const { x, y } of [...values, ...discs, ...discs.map(({ label }) => label)]) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(SCHEMATIC_WIDTH);
      expect(y).toBeGreaterThanOrEqual(8);
      expect(y).toBeLessThanOrEqual(height - 8);
    }
  });

  it('names its fields as the catalogue does', () => {
    show('transimpedance', null);
    expect(screen.getByLabelText('feedback resistance')).toHaveValue('1 MΩ');
    expect(screen.getByLabelText('feedback capacitance')).toHaveAttribute('placeholder', 'auto');
  });
});

describe('a disc’s radius', () => {
  it('goes with the root of the share and stays within bounds', () => {
    expect(discRadius(0.25)).toBe(WHOLE_RADIUS / 2);
    expect([discRadius(-1), discRadius(2)]).toEqual([0, WHOLE_RADIUS]);
  });
});
