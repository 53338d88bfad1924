import type { ReactNode } from 'react';

/** What is wrong, beside where it can be mended. */
export function FieldMessage({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} role="alert" style={{ marginTop: 4, color: 'var(--rust)', fontSize: 14 }}>
      {children}
    </p>
  );
}
