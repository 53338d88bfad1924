import {
  networkPieces,
  opAmpPieces,
  type PartPlace,
  type StagePrices,
  type WholeStage,
} from '@roothertz/common/noise';
import type { Topology } from '@roothertz/common/conditions';
import { dividedHalfUp, PRICE_DECIMALS, scaledText, toScaled } from '@roothertz/common/prices';
import type { ListedResistor } from '../library/listed-resistors.js';
import { type PriceBook, QuantityPrices } from '../prices/price-book.js';
import type { StagePieceDto, StagePlace, StagePriceDto } from './dto/stage-ranking.dto.js';
import type { IndexedLibrary } from './library-index.service.js';
import { toPrice } from './price-response.js';

interface Piece {
  place: StagePlace;
  partId: number;
  pieces: number;
}

/** What the parts of whole stages cost, each at the pieces that all stages together need. */
export class StagePricing {
  private readonly atPieces = new Map<number, QuantityPrices>();

  constructor(
    private readonly book: PriceBook,
    private readonly quantity: number,
    private readonly libraries: readonly IndexedLibrary[],
    private readonly resistors: readonly ListedResistor[],
  ) {}

  /** The prices as the search adds them up. */
  ofParts(): StagePrices {
    return {
      quantity: this.quantity,
      opAmp: (place, pieces) => this.total(this.idOf(place), pieces),
      resistor: (index, pieces) => this.total(this.resistors[index].id, pieces),
    };
  }

  /** The parts of a stage with their prices; pieces of one part are bought together. */
  piecesOf(stage: WholeStage, topology: Topology): StagePieceDto[] {
    const pieces = this.list(stage, topology);
    const ids = [...new Set(pieces.map(({ partId }) => partId))];
    return ids.map((id) => {
      const same = pieces.filter(({ partId }) => partId === id);
      const count = same.reduce((sum, piece) => sum + piece.pieces, 0);
      const unitPrice = toPrice(this.at(count * this.quantity), id);
      return { places: same.map(({ place }) => place), pieces: count, unitPrice };
    });
  }

  /** What a stage costs; null where one of its parts is without a price. */
  priceOf(pieces: readonly StagePieceDto[]): StagePriceDto | null {
    const prices = pieces.flatMap(({ unitPrice }) => unitPrice ?? []);
    if (prices.length < pieces.length) return null;
    const total = prices.reduce((sum, price) => sum + toScaled(price.total, PRICE_DECIMALS), 0n);
    return {
      amount: scaledText(dividedHalfUp(total, BigInt(this.quantity)), PRICE_DECIMALS),
      currency: this.book.currency,
      total: scaledText(total, PRICE_DECIMALS),
      isStale: prices.some(({ isStale }) => isStale),
    };
  }

  private list(stage: WholeStage, topology: Topology): Piece[] {
    const { channelsInParallel, network, library, row } = stage;
    const channels = this.libraries[library].columns.parameters.channels[row];
    const { gain, feedback } = networkPieces(topology, channelsInParallel);
    const ofResistor = (place: StagePlace, index: number | null, pieces: number) =>
      index === null ? [] : [{ place, partId: this.resistors[index].id, pieces }];
    return [
      { place: 'op-amp', partId: this.idOf(stage), pieces: opAmpPieces(topology, channels) },
      ...ofResistor('gain', network.gainResistor, gain),
      ...ofResistor('feedback', network.feedbackResistor, feedback),
    ];
  }

  private idOf({ library, row }: PartPlace): number {
    return this.libraries[library].ids[row];
  }

  private total(partId: number, pieces: number): number {
    const price = this.at(pieces).of(partId);
    return price === null ? NaN : Number(toScaled(price.total, PRICE_DECIMALS));
  }

  private at(pieces: number): QuantityPrices {
    const known = this.atPieces.get(pieces) ?? new QuantityPrices(this.book, pieces);
    this.atPieces.set(pieces, known);
    return known;
  }
}
