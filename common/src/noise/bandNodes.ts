import type { OperatingConditions } from '../conditions/index.js';
import { gaussLegendre, gradedPanels, type Complex, type Feature } from '../numeric/index.js';
import { filterPower, flickerNoiseBandwidth, whiteNoiseBandwidth } from './band.js';
import { BOLTZMANN, PLANCK } from './constants.js';
import { sourcePowerDensity, sourceTemperature } from './sourceNoise.js';
import { emptyNodes, type Nodes } from './stage/nodes.js';
import { thermalPowerDensity } from './thermal.js';

const RULE = gaussLegendre(6);
/** Longest panel in ln f: real poles lie π/2 away from the axis of ln f. */
const LONGEST = 2.4;
/** Where a low-pass's tail is cut: the part beyond is about this share of the whole. */
const TAIL = 10 ** -5.5;

/**
 * The one node at which densities are stated, with weight 1. The source's density is 1 there, so that a
 * stage's `source` integral is the power gain of the signal, also of a source without noise.
 */
export function spotNode(conditions: OperatingConditions, frequency: number): Nodes {
  const nodes = emptyNodes(1);
  setNode(nodes, 0, conditions, frequency, 1);
  nodes.sourcePower[0] = 1;
  return nodes;
}

/**
 * One node that stands for the whole band: where nothing depends on frequency, its weights are the closed
 * forms of the noise bandwidth and of the integral of 1/f.
 */
export function closedFormNode(conditions: OperatingConditions): Nodes {
  const nodes = emptyNodes(1);
  setNode(nodes, 0, conditions, 0, whiteNoiseBandwidth(conditions.band));
  nodes.flicker[0] = flickerNoiseBandwidth(conditions.band);
  return nodes;
}

/** Whether Planck's factor differs from 1 by less than 1e-5 over the band and a decade beyond. */
export function isClassical(conditions: OperatingConditions): boolean {
  const coldest = Math.min(conditions.ambientTemperature, sourceTemperature(conditions));
  return PLANCK * conditions.band.upper * 10 < 2e-5 * BOLTZMANN * coldest;
}

/**
 * Nodes of a composite Gauss–Legendre quadrature in ln f over the band and its low-pass's tail, fine where
 * one of the poles comes near to the axis of frequency.
 *
 * @param poles of all amplifiers that use the nodes
 * @param growth powers of f by which the densities grow towards infinity
 */
export function quadratureNodes(
  conditions: OperatingConditions,
  poles: readonly PoleRange[],
  growth: 0 | 2,
): Nodes {
  const { band } = conditions;
  const finite = poles.filter(({ to }) => Number.isFinite(to));
  const features = [...finite.map(feature), ...filterFeatures(conditions)];
  const top = band.lowPassOrder === 0 ? band.upper : tailEnd(conditions, finite, growth);
  const panels = gradedPanels(Math.log(band.lower), Math.log(top), features, LONGEST);
  return panelNodes(conditions, panels);
}

/** A pole of one amplifier, or of several: its frequency in Hz and its angle from the axis of frequency. */
export interface PoleRange {
  from: number;
  to: number;
  angle: number;
}

/** Frequency and angle of a pole in rad/s. */
export function poleRange(pole: Complex): PoleRange {
  const frequency = Math.hypot(pole.re, pole.im) / (2 * Math.PI);
  return { from: frequency, to: frequency, angle: Math.atan2(Math.abs(pole.re), Math.abs(pole.im)) };
}

function feature({ from, to, angle }: PoleRange): Feature {
  return { from: Math.log(from), to: Math.log(to), width: angle };
}

function filterFeatures({ band }: OperatingConditions): Feature[] {
  if (band.lowPassOrder === 0) return [];
  return [feature({ from: band.upper, to: band.upper, angle: Math.PI / (2 * band.lowPassOrder) })];
}

/** Up to the second order a resonance counts however far beyond the band it lies. */
function tailEnd({ band }: OperatingConditions, poles: readonly PoleRange[], growth: 0 | 2): number {
  const decay = 2 * band.lowPassOrder - 1 - growth;
  const highest = Math.max(band.upper, ...poles.map(({ to }) => to));
  if (decay < 1) return highest / TAIL;
  const beyondPoles = 30 * highest;
  return Math.max(
    band.upper * TAIL ** (-1 / decay),
    band.lowPassOrder > 2 ? Math.min(beyondPoles, band.upper / TAIL) : beyondPoles,
  );
}

function panelNodes(conditions: OperatingConditions, panels: readonly number[]): Nodes {
  const order = RULE.nodes.length;
  const nodes = emptyNodes((panels.length - 1) * order);
  for (let p = 0; p < panels.length - 1; p++) {
    const half = (panels[p + 1] - panels[p]) / 2;
    for (let j = 0; j < order; j++) {
      const frequency = Math.exp(panels[p] + half * (1 + RULE.nodes[j]));
      const power = filterPower(conditions.band, frequency);
      setNode(nodes, p * order + j, conditions, frequency, power * half * RULE.weights[j] * frequency);
    }
  }
  return nodes;
}

function setNode(
  nodes: Nodes,
  k: number,
  conditions: OperatingConditions,
  frequency: number,
  weight: number,
): void {
  nodes.frequency[k] = frequency;
  nodes.angular[k] = 2 * Math.PI * frequency;
  nodes.white[k] = weight;
  nodes.flicker[k] = weight / frequency;
  nodes.sourcePower[k] = sourcePowerDensity(conditions, sourceTemperature(conditions), frequency);
  nodes.ambientPower[k] = thermalPowerDensity(conditions.ambientTemperature, frequency);
}
