import { boundsError, type QuantityField } from '@roothertz/common/parts';
import { formatEditable, type Range } from '@roothertz/common/units';
import { useState, type KeyboardEvent } from 'react';
import { readField, readRange } from './readField';
import { stepQuantity } from './stepQuantity';

export interface DraftOptions {
  field: QuantityField;
  /** In SI units; null = empty, which only a field with an `emptyText` allows. */
  value: number | null;
  /** What an empty field means, such as "unknown"; left out = the field can't be empty. */
  emptyText?: string;
  onCommit: (value: number | null) => void;
  /** Takes both ends where a range is typed, such as "0.1-10 Hz"; left out = the field holds one value. */
  onRange?: (range: Range) => void;
  /** Puts what is written only in this field into words that any field reads. */
  spell?: (typed: string) => string;
  /** Told of a text that can't be read, and when it is gone. */
  onInvalid?: (message: string | null) => void;
}

/** A quantity field's text while it is typed, until it is committed or given up. */
export function useQuantityDraft(options: DraftOptions) {
  const { field, emptyText, onCommit, onRange, spell = asTyped, onInvalid } = options;
  const [draft, setDraft] = useState<string | null>(null);
  const [message, setMessage] = useState<string | null>(null);
  const [value, hold] = useHeldValue(options.value);
  const resting = value === null ? '' : formatEditable(value, field.kind);
  const text = draft ?? resting;

  const settle = (next: string | null, problem: string | null) => {
    setDraft(next);
    setMessage(problem);
    onInvalid?.(problem);
  };
  const take = (next: number | null) => {
    settle(null, null);
    if (next === value) return;
    hold(next);
    onCommit(next);
  };
  const commit = () => {
    if (draft === null) return;
    if (draft === resting) return settle(null, null);
    const range = onRange && readRange(field, draft);
    if (range) {
      settle(null, null);
      return onRange(range);
    }
    const reading = readField(field, spell(draft), emptyText);
    if (reading.ok) take(reading.value);
    else settle(draft, reading.message);
  };
  const step = (direction: 1 | -1) => {
    const reading = readField(field, text, emptyText);
    if (!reading.ok || reading.value === null) return;
    const next = stepQuantity(reading.value, field.kind, direction);
    if (boundsError(field, next) === null) take(next);
  };
  const change = (typed: string) => settle(typed, null);
  const onKeyDown = keyHandler({ commit, step, revert: () => settle(null, null) });
  return { text, message, change, commit, onKeyDown };
}

function asTyped(typed: string): string {
  return typed;
}

/** The value, or what was committed in its place until the page has taken it: the old one doesn't flash up. */
function useHeldValue(value: number | null): [number | null, (next: number | null) => void] {
  const [held, setHeld] = useState<{ over: number | null; value: number | null } | null>(null);
  const isTaken = held !== null && held.over !== value;
  if (isTaken) setHeld(null);
  const shown = held === null || isTaken ? value : held.value;
  return [shown, (next) => setHeld({ over: value, value: next })];
}

interface KeyActions {
  commit: () => void;
  step: (direction: 1 | -1) => void;
  revert: () => void;
}

function keyHandler({ commit, step, revert }: KeyActions) {
  const actions: Record<string, () => void> = {
    Enter: commit,
    ArrowUp: () => step(1),
    ArrowDown: () => step(-1),
  };
  return (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Escape') return revert();
    const action = actions[event.key];
    if (action === undefined) return;
    event.preventDefault();
    action();
  };
}
