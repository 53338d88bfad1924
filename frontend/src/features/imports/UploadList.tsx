import { refusalOf } from '@roothertz/common/access';
import { Button, Segmented, Upload } from 'antd';
import { useState } from 'react';
import type { ImportKind } from '../../api/imports';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import { useMember } from '../../components/useMember';
import { KINDS } from './kinds';
import styles from './UploadList.module.css';
import { useUpload } from './useUpload';

const KIND_OPTIONS = Object.entries(KINDS).map(([value, { title, action }]) => ({
  value: value as ImportKind,
  label: title,
  action,
}));

/** Takes a list, dropped or chosen; nothing changes by that. */
export function UploadList() {
  const member = useMember();
  const options = KIND_OPTIONS.filter(({ action }) => refusalOf(member, action) === null);
  const [kind, setKind] = useState(options[0].value);
  const upload = useUpload();
  return (
    <section className={styles.upload} aria-label="Upload a list">
      <div className={styles.kind}>
        <span>The list holds</span>
        <Segmented
          aria-label="Kind of list"
          options={options.map(({ value, label }) => ({ value, label }))}
          value={kind}
          onChange={setKind}
        />
      </div>
      <Upload.Dragger
        accept=".csv,.txt,.tsv,text/csv,text/plain"
        showUploadList={false}
        disabled={upload.isPending}
        beforeUpload={(file) => {
          upload.mutate({ kind, file });
          return false;
        }}
      >
        <p className={styles.lead}>Drop the list here, or choose a file</p>
        <p className={styles.hint}>
          {kind === 'prices'
            ? 'A supplier’s quotation as CSV, with a column of prices for each quantity or a row for each, up to 50 000 rows.'
            : 'A CSV as the spreadsheet or ERP wrote it, up to 100 MB and 500 000 rows.'}{' '}
          Nothing changes yet: every row is checked first.
        </p>
      </Upload.Dragger>
      {upload.isPending && (
        <p role="status">
          Sending and reading {upload.variables.file.name}… <Button onClick={upload.cancel}>Cancel</Button>
        </p>
      )}
      {upload.error && <FieldMessage>{detailOf(upload.error)}</FieldMessage>}
    </section>
  );
}
