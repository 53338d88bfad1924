import { type RefObject, useEffect, useRef } from 'react';

/** Whether what had the focus is gone. */
export function isFocusLost(): boolean {
  return document.activeElement === null || document.activeElement === document.body;
}

/** Puts the focus on an element, such as a page's heading, where it was lost with a change that a text tells of. */
export function useFocusAfterChange<Place extends HTMLElement>(text: string): RefObject<Place | null> {
  const place = useRef<Place>(null);
  const last = useRef(text);
  useEffect(() => {
    const isOther = text !== last.current;
    last.current = text;
    if (isOther && isFocusLost()) place.current?.focus();
  }, [text]);
  return place;
}

/** Puts the focus on an element, such as a list's heading, where it was lost with an item of the list. */
export function useFocusAfterLoss<Place extends HTMLElement>(count: number): RefObject<Place | null> {
  const place = useRef<Place>(null);
  const last = useRef(count);
  useEffect(() => {
    const isFewer = count < last.current;
    last.current = count;
    if (isFewer && isFocusLost()) (place.current ?? document.getElementById('main'))?.focus();
  }, [count]);
  return place;
}
