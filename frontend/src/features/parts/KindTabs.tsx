import { LinkTabs } from '../../components/LinkTabs';
import styles from './KindTabs.module.css';
import type { KindOfPart } from './kindOfPart';
import { OP_AMPS } from './opAmps';
import { PARTS_VIEWS, type PartsPlace, placeAddress } from './partsPlace';
import { RESISTORS } from './resistors';

const KINDS = [OP_AMPS, RESISTORS];

/** The same view of each kind of part. */
export function KindTabs({ place }: { place: PartsPlace }) {
  const tabs = KINDS.map((kind) => ({ to: placeAddress(kind, place), label: `${kind.title}s` }));
  return <LinkTabs label="Kinds of part" tabs={tabs} />;
}

/** The views of a kind's parts. */
export function ViewTabs({ kind }: { kind: KindOfPart }) {
  const tabs = PARTS_VIEWS.map(({ place, label }) => ({ to: placeAddress(kind, place), label }));
  return <LinkTabs label="Views of the parts" tabs={tabs} className={styles.views} />;
}
