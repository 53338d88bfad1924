import { Select } from 'antd';
import type { QuantityField } from '@roothertz/common/parts';
import type { ReactNode } from 'react';
import type { Dialect, DialectChoice, Import } from '../../api/imports';
import { QuantityInput } from '../../components/QuantityInput';
import { KINDS } from './kinds';
import styles from './Detected.module.css';
import { moment } from '../../components/moments';
import { grouped } from '../../components/countOf';

interface DetectedProps {
  imported: Import;
  canChange: boolean;
  onOverrule: (choice: DialectChoice) => void;
}

const HEADER_LINE: QuantityField = {
  label: 'header line',
  kind: 'count',
  bounds: { from: 1, to: 1_000_000 },
  integer: true,
  help: 'The line on which the headings stand, from 1.',
};

const ENCODINGS: Record<Dialect['encoding'], string> = {
  'utf-8': 'UTF-8',
  'utf-16le': 'UTF-16 LE',
  'utf-16be': 'UTF-16 BE',
  'windows-1252': 'Windows-1252',
};
const DELIMITERS: Record<Dialect['delimiter'], string> = {
  comma: 'comma',
  semicolon: 'semicolon',
  tab: 'tab',
  pipe: 'pipe',
};
const DECIMAL_MARKS: Record<Dialect['decimalMark'], string> = { point: 'point', comma: 'comma' };

/** The file, and how it was found to be written; each fact can be overruled. */
export function Detected({ imported, canChange, onOverrule }: DetectedProps) {
  const { fileName, kind, dialect, rowCount, createdAt, createdBy } = imported;
  const choice = { canChange, dialect, onOverrule };
  return (
    <header className={styles.detected}>
      <h1 className={styles.name}>{fileName}</h1>
      <dl className={styles.facts}>
        <Fact term="Holds">{KINDS[kind].title.toLowerCase()}</Fact>
        <Fact term="Encoding">
          <Choice name="encoding" label="Encoding" words={ENCODINGS} {...choice} />
        </Fact>
        <Fact term="Delimiter">
          <Choice name="delimiter" label="Delimiter" words={DELIMITERS} {...choice} />
        </Fact>
        <Fact term="Decimal mark">
          <Choice name="decimalMark" label="Decimal mark" words={DECIMAL_MARKS} {...choice} />
        </Fact>
        <Fact term="Header">
          line{' '}
          {canChange ? (
            <QuantityInput
              variant="inline"
              field={HEADER_LINE}
              value={dialect.headerLine}
              onCommit={(line) => onOverrule({ headerLine: line ?? undefined })}
            />
          ) : (
            dialect.headerLine
          )}
        </Fact>
        <Fact term="Rows">{grouped(rowCount)}</Fact>
      </dl>
      <p className={styles.reader}>
        read by {createdBy?.name ?? 'a former member'}
        <br />
        {moment(createdAt)}
      </p>
    </header>
  );
}

function Fact({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div>
      <dt>{term}</dt>
      <dd>{children}</dd>
    </div>
  );
}

interface ChoiceProps<Name extends 'encoding' | 'delimiter' | 'decimalMark'> extends Omit<
  DetectedProps,
  'imported'
> {
  name: Name;
  label: string;
  dialect: Dialect;
  words: Record<Dialect[Name], string>;
}

function Choice<Name extends 'encoding' | 'delimiter' | 'decimalMark'>({
  name,
  label,
  words,
  dialect,
  canChange,
  onOverrule,
}: ChoiceProps<Name>) {
  if (!canChange) return words[dialect[name]];
  return (
    <Select<string>
      size="small"
      variant="borderless"
      suffixIcon={null}
      className={styles.choice}
      popupMatchSelectWidth={false}
      aria-label={label}
      value={dialect[name]}
      options={Object.entries<string>(words).map(([value, text]) => ({ value, label: text }))}
      onChange={(chosen) => onOverrule({ [name]: chosen })}
    />
  );
}
