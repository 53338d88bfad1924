import { Popconfirm } from 'antd';
import { type ComponentRef, type ReactElement, useEffect, useId, useRef, useState } from 'react';
import { isFocusLost } from './lostFocus';

interface AskFirstProps {
  question: string;
  /** What becomes of it. */
  outcome: string;
  verb: string;
  refusal?: string;
  onAgree: () => void;
  /** The button that asks. */
  children: ReactElement;
}

/** Asks before what can't be taken back; the focus goes into the question, and back to where it was asked. */
export function AskFirst({ question, outcome, verb, refusal, onAgree, children }: AskFirstProps) {
  const asked = useRef<ComponentRef<typeof Popconfirm>>(null);
  const [id, refusalId] = [useId(), useId()];
  const [timesAsked, setTimesAsked] = useState(0);
  const returnFocus = () => {
    const answers = document.getElementById(refusalId)?.parentElement;
    if (isFocusLost() || answers?.contains(document.activeElement)) asked.current?.nativeElement.focus();
  };
  return (
    <Popconfirm
      ref={asked}
      icon={null}
      title={<span id={id}>{question}</span>}
      description={<Outcome refusalId={refusalId} timesAsked={timesAsked} text={outcome} />}
      okText={verb}
      okButtonProps={{ 'aria-describedby': id }}
      cancelText={refusal}
      cancelButtonProps={{ id: refusalId, 'aria-describedby': id }}
      onOpenChange={(isOpen) => (isOpen ? setTimesAsked(timesAsked + 1) : returnFocus())}
      onConfirm={onAgree}
    >
      {children}
    </Popconfirm>
  );
}

interface OutcomeProps {
  text: string;
  refusalId: string;
  timesAsked: number;
}

/** Takes the focus to the way back as soon as the question is there, so that a second Enter does nothing. */
function Outcome({ text, refusalId, timesAsked }: OutcomeProps) {
  useEffect(
    () => document.getElementById(refusalId)?.focus({ preventScroll: true }),
    [refusalId, timesAsked],
  );
  return text;
}
