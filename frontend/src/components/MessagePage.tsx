import type { ReactNode } from 'react';
import styles from './MessagePage.module.css';

interface MessagePageProps {
  title: string;
  children: ReactNode;
}

/** A page that says one thing, and what to do next. */
export function MessagePage({ title, children }: MessagePageProps) {
  return (
    <section className={styles.page}>
      <title>{`${title} · Roothertz`}</title>
      <h1>{title}</h1>
      {children}
    </section>
  );
}
