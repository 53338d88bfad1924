import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { QuantityInput, type QuantityInputProps } from './QuantityInput';

const FIELD = CONDITION_FIELDS['conditions.source.resistance'];

function setUp(props: Partial<QuantityInputProps> = {}) {
  const onCommit = vi.fn();
  function Held() {
    const [value, setValue] = useState<number | null>(props.value === undefined ? 600 : props.value);
    const take = (next: number | null) => {
      onCommit(next);
      setValue(next);
    };
    return <QuantityInput field={FIELD} {...props} value={value} onCommit={take} />;
  }
  render(<Held />);
  return { input: screen.getByRole('textbox', { name: 'source resistance' }), onCommit };
}

async function type(input: HTMLElement, text: string) {
  await userEvent.clear(input);
  await userEvent.type(input, text);
}

describe.each(['form', 'inline'] as const)('a quantity field, %s', (variant) => {
  it('shows the value with its unit', () => {
    expect(setUp({ variant }).input).toHaveValue('600 Ω');
  });

  it('commits the SI value of "4k7" on Enter', async () => {
    const { input, onCommit } = setUp({ variant });
    await type(input, '4k7{Enter}');
    expect(onCommit.mock.calls).toEqual([[4700]]);
    expect(input).toHaveValue('4.7 kΩ');
  });

  it('goes back to the value on Escape', async () => {
    const { input, onCommit } = setUp({ variant });
    await type(input, '12{Escape}');
    expect(input).toHaveValue('600 Ω');
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('commits when the field is left', async () => {
    const { input, onCommit } = setUp({ variant });
    await type(input, '1 MΩ');
    await userEvent.tab();
    expect(onCommit.mock.calls).toEqual([[1e6]]);
  });

  it('keeps a text that it can’t read and says what was expected', async () => {
    const onInvalid = vi.fn();
    const { input, onCommit } = setUp({ variant, onInvalid });
    await type(input, '5 pF');
    await userEvent.tab();
    expect(input).toHaveValue('5 pF');
    expect(input).toBeInvalid();
    expect(input).toHaveAccessibleDescription(/a resistance/);
    expect(onInvalid).toHaveBeenLastCalledWith(expect.stringContaining('resistance'));
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('refuses a value out of bounds', async () => {
    const { input, onCommit } = setUp({ variant });
    await type(input, '-3{Enter}');
    expect(screen.getByRole('alert')).toHaveTextContent(/to 10\sTΩ was expected/);
    expect(onCommit).not.toHaveBeenCalled();
  });
});

describe('a quantity field', () => {
  it('doesn’t commit a value that nobody changed', async () => {
    const { input, onCommit } = setUp();
    await type(input, '600 ohm{Enter}');
    await userEvent.tab();
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('becomes empty where that means something', async () => {
    const { input, onCommit } = setUp({ emptyText: 'unknown' });
    await userEvent.clear(input);
    await userEvent.tab();
    expect(onCommit.mock.calls).toEqual([[null]]);
    expect(input).toHaveAttribute('placeholder', 'unknown');
  });

  it('can’t be empty where a value is needed', async () => {
    const { input, onCommit } = setUp();
    await userEvent.clear(input);
    await userEvent.tab();
    expect(screen.getByRole('alert')).toBeInTheDocument();
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('steps through the E12 series with the arrow keys', async () => {
    const { input, onCommit } = setUp();
    await userEvent.type(input, '{ArrowUp}{ArrowUp}{ArrowDown}');
    expect(onCommit.mock.calls).toEqual([[680], [820], [680]]);
  });

  it('shows what was committed until the page has taken it, and then what the page says', async () => {
    const field = (value: number) => <QuantityInput field={FIELD} value={value} onCommit={() => {}} />;
    const { rerender } = render(field(600));
    const input = screen.getByRole('textbox', { name: 'source resistance' });
    await type(input, '4k7{Enter}');
    expect(input).toHaveValue('4.7 kΩ');
    rerender(field(4700));
    expect(input).toHaveValue('4.7 kΩ');
    rerender(field(600));
    expect(input).toHaveValue('600 Ω');
  });

  it('hands over both ends of a range where somebody takes them', async () => {
    const onRange = vi.fn();
    const { input, onCommit } = setUp({ onRange });
    await type(input, '1k-10k{Enter}');
    expect(onRange.mock.calls).toEqual([[{ from: 1e3, to: 10e3 }]]);
    expect(input).toHaveValue('600 Ω');
    await type(input, '1k to 1e15{Enter}');
    expect(screen.getByRole('alert')).toHaveTextContent(/this is a range/);
    expect(onCommit).not.toHaveBeenCalled();
  });

  it('shows an error that comes from elsewhere', () => {
    expect(setUp({ error: 'too high for this source' }).input).toHaveAccessibleDescription(
      'too high for this source',
    );
  });
});
