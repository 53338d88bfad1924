import type { Contributions } from '@roothertz/common/noise';
import { ConditionField } from '../ConditionField';
import { useConditionsForm } from '../ConditionsContext';
import { valueAt } from '../requestPath';
import { STAGE_KIND_LABELS, stageKindOf } from '../stageKind';
import { FeedbackResistance } from './FeedbackResistance';
import { LAYOUTS } from './layouts';
import { SCHEMATIC_WIDTH, type ValuePlace } from './layout';
import { NoiseDisc } from './NoiseDisc';
import styles from './Schematic.module.css';
import { SchematicDrawing } from './SchematicDrawing';

/** The stage as a drawing whose values are the fields, with the noise of the selected part on its elements. */
export function Schematic({ shares }: { shares: Contributions | null }) {
  const { request } = useConditionsForm();
  const kind = stageKindOf(request.conditions.stage);
  const layout = LAYOUTS[kind];
  return (
    <div className={styles.schematic} style={{ width: SCHEMATIC_WIDTH, height: layout.height }}>
      <SchematicDrawing
        layout={layout}
        title={`${STAGE_KIND_LABELS[kind]} stage. Discs show each generator’s share of the noise.`}
        isAbsent={(field) => !valueAt(request, field)}
      >
        {shares &&
          layout.discs.map((place) => (
            <NoiseDisc key={place.contributor} place={place} share={shares[place.contributor]} />
          ))}
      </SchematicDrawing>
      {layout.values.map((place) => (
        <SchematicValue key={place.field} place={place} />
      ))}
      {layout.feedbackResistances?.map((place) => (
        <FeedbackResistance key={place.y} {...place} />
      ))}
    </div>
  );
}

function SchematicValue({ place }: { place: ValuePlace }) {
  const { field, x, y, align = 'centre', before, emptyText } = place;
  return (
    <span
      className={styles.value}
      data-align={align}
      data-half={x > SCHEMATIC_WIDTH / 2 ? 'right' : 'left'}
      style={{ left: x, top: y }}
    >
      {before && <span className={styles.before}>{before} </span>}
      <ConditionField path={field} emptyText={emptyText} />
    </span>
  );
}
