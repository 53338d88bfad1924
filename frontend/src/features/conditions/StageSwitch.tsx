import { FieldMessage } from '../../components/FieldMessage';
import { useConditionsForm } from './ConditionsContext';
import { STAGE_KIND_LABELS, STAGE_KINDS, stageKindOf, withStageKind } from './stageKind';
import styles from './StageSwitch.module.css';

/** Chooses the kind of stage; source, band and what the new stage can use stay. */
export function StageSwitch() {
  const { request, messages, replace } = useConditionsForm();
  const current = stageKindOf(request.conditions.stage);
  const message = messages.get('conditions.stage.topology');
  return (
    <fieldset className={styles.switch}>
      <legend className="visually-hidden">Stage</legend>
      {STAGE_KINDS.map((kind) => (
        <label key={kind} className={styles.kind}>
          <input
            type="radio"
            name="stage"
            className="visually-hidden"
            checked={kind === current}
            onChange={() => replace((before) => withStageKind(before, kind))}
          />
          {STAGE_KIND_LABELS[kind]}
        </label>
      ))}
      {message && <FieldMessage>{message}</FieldMessage>}
    </fieldset>
  );
}
