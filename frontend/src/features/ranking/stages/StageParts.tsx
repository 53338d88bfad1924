import { Button } from 'antd';
import { Link } from 'react-router-dom';
import type { WholeStage } from '../../../api/stages';
import { priceText } from '../../../components/priceText';
import budgetStyles from '../PartBudget.module.css';
import styles from './StageParts.module.css';
import { stageParts, type StagePart } from './stagePartRows';

interface StagePartsProps {
  stage: WholeStage;
  quantity: number;
  /** Takes the network over into the schematic; null where there is none. */
  onTake: (() => void) | null;
}

/** The parts that make the selected stage, with their prices, and the way of its network into the schematic. */
export function StageParts({ stage, quantity, onTake }: StagePartsProps) {
  return (
    <section aria-label={`Parts of the stage with ${stage.part.partNumber}`} className={budgetStyles.part}>
      <h2 className={budgetStyles.heading}>
        Parts of a stage, priced for {quantity === 1 ? '1 stage' : `${quantity} stages`}
      </h2>
      <table className={`${budgetStyles.budget} ${styles.parts}`}>
        <thead className="visually-hidden">
          <tr>
            <th>part</th>
            <th>pieces</th>
            <th>price of a piece</th>
          </tr>
        </thead>
        <tbody>
          {stageParts(stage).map((part) => (
            <PartRow key={part.path} {...part} />
          ))}
          <tr className={budgetStyles.total}>
            <th scope="row">a stage</th>
            <td />
            <td>{stage.unitPrice ? priceText(stage.unitPrice) : 'no price'}</td>
          </tr>
        </tbody>
      </table>
      {onTake && (
        <Button size="small" onClick={onTake}>
          Take this network into the schematic
        </Button>
      )}
    </section>
  );
}

function PartRow({ symbols, name, path, pieces, price }: StagePart) {
  return (
    <tr>
      <th scope="row" className={styles.name}>
        {symbols && `${symbols} `}
        <Link to={path}>{name}</Link>
      </th>
      <td>{pieces}</td>
      <td>{price}</td>
    </tr>
  );
}
