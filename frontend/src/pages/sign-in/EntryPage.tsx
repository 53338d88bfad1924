import type { ReactNode } from 'react';
import { Mark } from '../../components/Mark';
import styles from './SignInPage.module.css';

interface EntryPageProps {
  title: string;
  children: ReactNode;
  note?: ReactNode;
}

/** A page that stands before the sign-in. */
export function EntryPage({ title, children, note }: EntryPageProps) {
  return (
    <main className={styles.page}>
      <title>{`${title} · Roothertz`}</title>
      <div className={styles.panel}>
        <Mark />
        <h1 className={styles.title}>{title}</h1>
        {children}
        {note && <p className={styles.note}>{note}</p>}
      </div>
    </main>
  );
}
