import { CONTRIBUTORS, type Contributions, isFollower, type SoughtStage } from '@roothertz/common/noise';
import { formatQuantity } from '@roothertz/common/units';
import type { StageItem, WholeStage } from '../../../api/stages';
import { barOf, barScale, type Bar } from '../barScale';
import { cautionsOfPart } from '../cautionsOf';
import { FLOOR_ID, type GridRow } from '../gridRows';
import { libraryOf, numberOf, sharedNumbers } from '../libraryWords';
import { commonUnit, inUnit, noiseKind } from '../noiseUnit';
import { amountText, priceHeading } from '../priceWords';
import { stageParts } from './stagePartRows';
import type { ShownStages } from './useStages';

/** A resistor of the network as its cell shows it. */
export interface NetworkPart {
  symbol: 'R_g' | 'R_f';
  value: string;
  partNumber: string;
  maker: string;
}

export interface StageRow {
  id: string;
  place: number | null;
  part: Omit<GridRow['part'], 'approval'>;
  network: NetworkPart[];
  gain: { text: string; channelsInParallel: number };
  noise: { text: string; aboveFloor: string };
  budget: { bar: Bar; contributions: Contributions };
  price: { text: string; title: string };
}

export interface StageRows {
  /** The unit of the noise column. */
  unit: string;
  /** The heading of the price column; null where there is none. */
  priceHeading: string | null;
  floor: StageRow;
  rows: StageRow[];
}

/** The rows of whole stages under the source floor, all figures in one unit, all bars in one scale. */
export function stageRows({ first, items, request }: ShownStages): StageRows {
  const { stage } = request.conditions;
  const floor = first.floor.inputNoiseRms;
  const quietest = items.length === 0 ? floor : Math.min(...items.map((item) => item.inputNoiseRms));
  const unit = commonUnit(floor || quietest, noiseKind(stage.topology));
  const scale = barScale(floor, quietest);
  const shared = sharedNumbers(items.flatMap(partsOf));
  return {
    unit,
    priceHeading: priceHeading([...items, ...first.frontier], request.quantity ?? 1),
    floor: floorRow(floor, unit, scale),
    rows: items.map((item) => rowOf(item, stage, unit, scale, shared)),
  };
}

function rowOf(
  item: StageItem,
  stage: SoughtStage,
  unit: string,
  scale: number,
  shared: ReadonlySet<string>,
): StageRow {
  const { part, rank, contributions, network, channelsInParallel, aboveFloor } = item;
  return {
    id: part.id,
    place: rank,
    part: {
      name: part.partNumber,
      library: libraryOf(part, shared),
      maker: part.manufacturer,
      cautions: cautionsOfPart(item.cautions),
    },
    network: networkOf(network, shared),
    gain: { text: gainOf(network.gain, stage), channelsInParallel },
    noise: {
      text: inUnit(item.inputNoiseRms, unit),
      aboveFloor: aboveFloor === null ? '–' : formatQuantity(aboveFloor, 'decibel'),
    },
    budget: { bar: barOf(contributions, scale), contributions },
    price: priceOf(item),
  };
}

/** The op-amp and the resistors of a stage. */
export function partsOf({ part, network: { gainResistor, feedbackResistor } }: WholeStage) {
  return [part, gainResistor, feedbackResistor].filter((one) => one !== null);
}

function priceOf(item: StageItem): StageRow['price'] {
  const title = stageParts(item).map(({ pieces, name, price }) => `${pieces} ${name}: ${price}`);
  return { text: item.unitPrice ? amountText(item.unitPrice) : 'no price', title: title.join('\n') };
}

function networkOf(
  { gainResistor, feedbackResistor }: StageItem['network'],
  shared: ReadonlySet<string>,
): NetworkPart[] {
  const places = [
    { symbol: 'R_g', resistor: gainResistor },
    { symbol: 'R_f', resistor: feedbackResistor },
  ] as const;
  return places.flatMap(({ symbol, resistor }) =>
    resistor
      ? [
          {
            symbol,
            value: formatQuantity(resistor.resistance, 'resistance', { trim: true, digits: 4 }),
            partNumber: numberOf(resistor, shared),
            maker: resistor.manufacturer,
          },
        ]
      : [],
  );
}

function gainOf(gain: number, stage: SoughtStage): string {
  if (stage.topology === 'transimpedance') return '';
  return isFollower(stage) ? '1' : formatQuantity(gain, 'gain', { digits: 4 });
}

function floorRow(rms: number, unit: string, scale: number): StageRow {
  const nothing = Object.fromEntries(CONTRIBUTORS.map((contributor) => [contributor, 0])) as Contributions;
  const contributions = { ...nothing, source: rms };
  return {
    id: FLOOR_ID,
    place: null,
    part: { name: '', library: null, maker: 'source floor', cautions: [] },
    network: [],
    gain: { text: '', channelsInParallel: 1 },
    noise: { text: inUnit(rms, unit), aboveFloor: rms > 0 ? formatQuantity(0, 'decibel') : '–' },
    budget: { bar: barOf(contributions, scale), contributions },
    price: { text: '', title: '' },
  };
}
