import { Button } from 'antd';
import { Link } from 'react-router-dom';
import type { WholeStage } from '../../../api/stages';
import { priceText } from '../../../components/priceText';
import budgetStyles from '../PartBudget.module.css';
import styles from './StageParts.module.css';
import { stageParts, unsoughtParts, type StagePart, type UnsoughtPart } from './stagePartRows';

interface StagePartsProps {
  stage: WholeStage;
  quantity: number;
  /** Takes the network over into the schematic; null where there is none. */
  onTake: (() => void) | null;
}

/** The parts that make the selected stage, with their prices, and the way of its network into the schematic. */
export function StageParts({ stage, quantity, onTake }: StagePartsProps) {
  const unsought = unsoughtParts(stage);
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
            <th scope="row">{unsought.length === 0 ? 'a stage' : 'a stage, without the parts below'}</th>
            <td />
            <td>{stage.unitPrice ? priceText(stage.unitPrice) : 'no price'}</td>
          </tr>
          {unsought.map((part) => (
            <UnsoughtRow key={part.symbols} {...part} />
          ))}
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

function UnsoughtRow({ symbols, what, pieces }: UnsoughtPart) {
  const [symbol, value = ''] = symbols.split(/ (.*)/);
  const [letter, index] = symbol.split('_');
  return (
    <tr className={styles.unsought}>
      <th scope="row" className={styles.name}>
        {letter}
        {index && <sub>{index}</sub>} {value} {what}
      </th>
      <td>{pieces}</td>
      <td>not sought</td>
    </tr>
  );
}

function PartRow({ symbols, name, library, path, pieces, price }: StagePart) {
  return (
    <tr>
      <th scope="row" className={styles.name}>
        {symbols && `${symbols} `}
        <Link to={path}>{name}</Link>
        <span className={styles.library}>, {library}</span>
      </th>
      <td>{pieces}</td>
      <td>{price}</td>
    </tr>
  );
}
