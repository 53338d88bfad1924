import { act, render } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { useAddress } from '../../components/useAddress';
import { useSearchAddress } from './search/useSearchAddress';
import { withStageKind } from './stageKind';
import { useConditionsAddress } from './useConditionsAddress';

function open(address: string) {
  const shown = {} as {
    conditions: ReturnType<typeof useConditionsAddress>;
    search: ReturnType<typeof useSearchAddress>;
  };
  function Page() {
    const query = useAddress();
    Object.assign(shown, { conditions: useConditionsAddress(query), search: useSearchAddress(query) });
    return null;
  }
  const router = createMemoryRouter([{ path: '/rank', element: <Page /> }], { initialEntries: [address] });
  render(<RouterProvider router={router} />);
  return { shown, router };
}

describe('the address of the conditions', () => {
  it('keeps both of two changes in one moment, whatever they are of', () => {
    const { shown, router } = open('/rank?stage=non-inverting&named=4');
    const { change, replace, selectPart } = shown.conditions;
    act(() => {
      change('conditions.source.resistance', 4700);
      change('conditions.stage.gain', 20);
      shown.search.stageSearch.change({ gtol: 0.02 });
      selectPart('7');
      shown.conditions.showView('stages');
      replace((before) => withStageKind(before, 'difference'));
    });
    expect(router.state.location.search).toBe(
      '?stage=difference&rs=4.7k&gain=20&rg=10&named=4&view=stages&gtol=2%25&part=7',
    );
  });

  it('goes back one change at a time', async () => {
    const { shown, router } = open('/rank?stage=non-inverting');
    act(() => shown.conditions.change('conditions.source.resistance', 4700));
    act(() => shown.conditions.change('conditions.stage.gain', 20));
    await act(() => router.navigate(-1));
    act(() => shown.conditions.change('conditions.stage.gainResistance', 22));
    expect(router.state.location.search).toBe('?stage=non-inverting&rs=4.7k&rg=22');
  });

  describe('after a network was taken that doesn’t give just the wanted gain', () => {
    const asked = '/rank?stage=non-inverting&gain=50&view=stages&gtol=2%25';
    const found = { topology: 'non-inverting', gain: 50.4, gainResistance: 22 } as const;
    const taken = () => {
      const { shown, router } = open(asked);
      act(() => shown.conditions.takeNetwork(found));
      return { shown, search: () => router.state.location.search };
    };

    it('holds what the network gives and what was wanted', () => {
      const { shown, search } = taken();
      expect(search()).toBe('?stage=non-inverting&gain=50.4&rg=22&gtol=2%25&want=50');
      expect(shown.conditions.wanted).toBe(50);
      expect(shown.conditions.request.conditions.stage.gain).toBe(50.4);
    });

    it('seeks whole stages for the wanted gain again', () => {
      const { shown, search } = taken();
      act(() => shown.conditions.change('conditions.source.resistance', 4700));
      act(() => shown.conditions.showView('stages'));
      expect(search()).toBe('?stage=non-inverting&rs=4.7k&gain=50&rg=22&gtol=2%25&view=stages');
    });

    it('forgets the wanted gain with another network', () => {
      const { shown } = taken();
      act(() => shown.conditions.change('conditions.stage.gainResistance', 27));
      expect(shown.conditions.wanted).toBeNull();
    });

    it('has none where the network gives just that', () => {
      const { shown, router } = open(asked);
      act(() => shown.conditions.takeNetwork({ ...found, gain: 50 }));
      expect(router.state.location.search).not.toContain('want');
    });
  });
});
