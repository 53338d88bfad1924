import { boundsError, type QuantityField } from '@roothertz/common/parts';
import { formatEditable } from '@roothertz/common/units';
import { useState, type KeyboardEvent } from 'react';
import { readField } from './readField';
import { stepQuantity } from './stepQuantity';

export interface DraftOptions {
  field: QuantityField;
  value: number | null;
  emptyText?: string;
  onCommit: (value: number | null) => void;
  onInvalid?: (message: string | null) => void;
}

/** A quantity field's text while it is typed, until it is committed or given up. */
export function useQuantityDraft({ field, value, emptyText, onCommit, onInvalid }: DraftOptions) {
  const [draft, setDraft] = useState<string | null>(null);
  const [message, setMessage] = useState<string | null>(null);
  const resting = value === null ? '' : formatEditable(value, field.kind);
  const text = draft ?? resting;

  const settle = (next: string | null, problem: string | null) => {
    setDraft(next);
    setMessage(problem);
    onInvalid?.(problem);
  };
  const take = (next: number | null) => {
    settle(null, null);
    if (next !== value) onCommit(next);
  };
  const commit = () => {
    if (draft === null) return;
    if (draft === resting) return settle(null, null);
    const reading = readField(field, draft, emptyText);
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
