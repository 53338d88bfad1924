import { NavLink } from 'react-router-dom';
import styles from './LinkTabs.module.css';

interface LinkTabsProps {
  label: string;
  tabs: readonly { to: string; label: string }[];
  className?: string;
}

/** Pages side by side; the open one is underlined. */
export function LinkTabs({ label, tabs, className = '' }: LinkTabsProps) {
  return (
    <nav aria-label={label} className={`${styles.tabs} ${className}`}>
      {tabs.map((tab) => (
        <NavLink key={tab.to} to={tab.to} end className={styles.tab}>
          {tab.label}
        </NavLink>
      ))}
    </nav>
  );
}
