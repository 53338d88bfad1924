import { TECHNOLOGIES, TECHNOLOGY_LABELS, type Technology } from '@roothertz/common/parts';
import { Checkbox } from 'antd';
import { useId, useState } from 'react';
import styles from './SearchFields.module.css';

interface TechnologyChoiceProps {
  chosen: readonly Technology[];
  onChange: (chosen: Technology[]) => void;
}

const OPTIONS = TECHNOLOGIES.map((value) => ({ value, label: TECHNOLOGY_LABELS[value] }));

/** Which technologies of resistors count: one line that says it, and the choices that fold out below. */
export function TechnologyChoice({ chosen, onChange }: TechnologyChoiceProps) {
  const [isOpen, setOpen] = useState(false);
  const id = useId();
  const text = chosen.length === 0 ? 'any' : chosen.map((one) => TECHNOLOGY_LABELS[one]).join(', ');
  return (
    <>
      <span>
        <span className={styles.label}>resistors of</span>
        <button
          type="button"
          className={styles.fill}
          aria-label={`technology of the resistors: ${text}`}
          aria-expanded={isOpen}
          aria-controls={id}
          onClick={() => setOpen(!isOpen)}
        >
          {chosen.length === 0 ? 'any technology' : text} {isOpen ? '▴' : '▾'}
        </button>
      </span>
      {isOpen && (
        <fieldset id={id} className={styles.choices}>
          <legend className="visually-hidden">Technology of the resistors</legend>
          <Checkbox.Group
            options={OPTIONS}
            value={[...chosen]}
            onChange={(next) => onChange(TECHNOLOGIES.filter((one) => next.includes(one)))}
          />
        </fieldset>
      )}
    </>
  );
}
