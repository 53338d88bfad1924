import { parallelConditions } from '../levers/parallelStage.js';
import type { AmplifierColumns } from '../ranking/columns.js';
import { leastNoise } from '../ranking/leastNoise.js';
import { preparedColumns } from '../ranking/preparedColumns.js';
import { scoreRows } from '../ranking/scores.js';
import { stageModel } from '../stage/stageModel.js';
import type { Block, Blocks } from './blocks.js';
import { channelColumns } from './channelColumns.js';
import { risingShare } from './risingNoise.js';
import { withNetwork, type Network, type SoughtConditions } from './stageSearch.js';

/** From this many op-amps on, bounds for all of them at once cost less than they save. */
const WORTH_BOUNDING = 1000;
/** Nodes that many op-amps share give an rms this near to that from nodes of its own. */
const ACCURACY = 1e-3;

/** The op-amps of one library that work with so many channels in parallel, looked at in one pass. */
export class CandidateGroup {
  private readonly columns: AmplifierColumns;

  constructor(
    private readonly sought: SoughtConditions,
    columns: AmplifierColumns,
    readonly library: number,
    readonly rows: Uint32Array,
    readonly channelsInParallel: number,
  ) {
    this.columns = channelColumns(columns, channelsInParallel);
  }

  /**
   * A lower bound of each row's noise with any of the networks: blocks of networks that are near to each other
   * are bounded for all rows together. 0 for few rows whose noise is known to rise from the first network on:
   * those cost less one by one.
   */
  leastNoises(blocks: Blocks): Float64Array {
    if (this.rows.length === 0) return new Float64Array();
    const whole = blocks.whole();
    const shares = this.risingShares(whole);
    const allRise = shares.every((share) => share > 0);
    if (allRise && !this.isLarge) return new Float64Array(this.rows.length);
    const risen = this.risen(whole, shares);
    if (allRise) return risen;
    const all = blocks.telling().map((block) => this.dipped(block));
    return risen.map((bound, place) => Math.max(bound, Math.min(...all.map((block) => block[place]))));
  }

  /** Says of each row whether with this network it surely makes at most so much noise. */
  isWithin(limit: number, network: Network): boolean[] {
    const conditions = this.conditionsWith(network);
    const { inputNoiseRms } = scoreRows(conditions, stageModel(conditions), this.columns, this.rows);
    return Array.from(inputNoiseRms, (noise) => noise * (1 + ACCURACY) <= limit);
  }

  private get isLarge(): boolean {
    return this.rows.length >= WORTH_BOUNDING;
  }

  private risingShares(block: Block): Float64Array {
    const { gainBandwidth, inputCapacitance } = preparedColumns(this.columns);
    const shareOf = risingShare(this.sought, block);
    return Float64Array.from(this.rows, (row) =>
      shareOf({ gainBandwidth: gainBandwidth[row], inputCapacitance: inputCapacitance[row] }),
    );
  }

  private risen(block: Block, shares: Float64Array): Float64Array {
    if (shares.every((share) => share === 0)) return shares;
    const least = this.leastOf(block.least);
    return shares.map((share, place) => share * block.gainDip * least[place]);
  }

  private dipped(block: Block): Float64Array {
    if (block.dip === 0) return new Float64Array(this.rows.length);
    return this.leastOf([...block.least, ...block.most]).map((noise) => block.dip * noise);
  }

  private leastOf(corners: readonly Network[]): Float64Array {
    const atCorners = corners.map((corner) => this.boundsWith(corner));
    return Float64Array.from(this.rows, (_, place) => Math.min(...atCorners.map((bounds) => bounds[place])));
  }

  /** Lower bounds with one network; where a lattice of amplifiers costs more than it saves, nearly the noise itself. */
  private boundsWith(network: Network): Float64Array {
    const conditions = this.conditionsWith(network);
    const model = stageModel(conditions);
    if (this.isLarge && !model.canNotch) return leastNoise(conditions, model, this.columns, this.rows).total;
    const { inputNoiseRms } = scoreRows(conditions, model, this.columns, this.rows);
    return inputNoiseRms.map((noise) => noise * (1 - ACCURACY));
  }

  private conditionsWith(network: Network) {
    return parallelConditions(withNetwork(this.sought, network), this.channelsInParallel);
  }
}
