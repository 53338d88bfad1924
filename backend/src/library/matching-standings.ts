import type { PartKind, Standing } from '@roothertz/common/parts';
import { type EntityManager, LessThan } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';
import { StandingChange } from './entities/standing-change.entity.js';
import type { PartSelect } from './part-select.js';

/** What would become of all parts of a filter that are to stand otherwise. */
export interface StandingOutcome {
  chosen: number;
  changed: number;
  /** They stand so already. */
  unchanged: number;
  curated: number;
}

const KEPT_MS = 24 * 60 * 60 * 1000;
const IS_TEAM = 'library.teamId IS NOT NULL';

export async function outcomeOf(select: PartSelect, wanted: Partial<Standing>): Promise<StandingOutcome> {
  const counts = await select
    .select('COUNT(*)', 'chosen')
    .addSelect(`SUM(NOT (${IS_TEAM}))`, 'curated')
    .addSelect(`SUM(${IS_TEAM} AND (${standsOtherwise(wanted)}))`, 'changed')
    .setParameters({ toLifecycle: wanted.lifecycle, toApproval: wanted.approval })
    .getRawOne<Record<string, string | null>>();
  const [chosen, curated, changed] = ['chosen', 'curated', 'changed'].map((key) => Number(counts![key]));
  return { chosen, changed, curated, unchanged: chosen - curated - changed };
}

/** Changes how the selected parts stand, and keeps how they stood before; those that stand so already are left alone. */
export async function changeMatching(
  manager: EntityManager,
  { teamId, userId }: Caller,
  kind: PartKind,
  select: PartSelect,
  wanted: Partial<Standing>,
): Promise<StandingChange> {
  const madeAt = new Date();
  await manager.delete(StandingChange, { teamId, madeAt: LessThan(new Date(Date.now() - KEPT_MS)) });
  const change = manager.create(StandingChange, { teamId, kind, partCount: 0, madeAt, madeById: userId });
  await manager.save(change);
  change.partCount = await keepStandings(manager, change, select, wanted);
  await manager.save(change);
  await manager.query(
    `UPDATE parts part JOIN standings_before was ON was.part_id = part.id AND was.change_id = ?
     SET part.lifecycle = COALESCE(?, part.lifecycle), part.approval = COALESCE(?, part.approval),
       part.version = was.version, part.updated_at = ?, part.updated_by = ?`,
    [change.id, wanted.lifecycle ?? null, wanted.approval ?? null, madeAt, userId],
  );
  return change;
}

/** Brings back how the parts stood; those that were changed since stay. Answers how many came back. */
export async function bringBack(
  manager: EntityManager,
  { userId }: Caller,
  change: StandingChange,
): Promise<number> {
  const { affectedRows } = (await manager.query(
    `UPDATE parts part
     JOIN standings_before was ON was.part_id = part.id AND was.change_id = ? AND was.version = part.version
     SET part.lifecycle = was.lifecycle, part.approval = was.approval, part.version = part.version + 1,
       part.updated_at = ?, part.updated_by = ?`,
    [change.id, new Date(), userId],
  )) as { affectedRows: number };
  await manager.delete(StandingChange, { id: change.id });
  return affectedRows;
}

export async function findStandingChange(
  manager: EntityManager,
  { teamId }: Caller,
  kind: PartKind,
  id: number | null,
): Promise<StandingChange> {
  const change = id === null ? null : await manager.findOneBy(StandingChange, { id, teamId, kind });
  if (change !== null) return change;
  throw new DomainError('standing-change.not-found', 'There is no such change that could be taken back.');
}

async function keepStandings(
  manager: EntityManager,
  { id }: StandingChange,
  select: PartSelect,
  wanted: Partial<Standing>,
): Promise<number> {
  const [found, parameters] = select
    .select('part.id', 'id')
    .andWhere(IS_TEAM)
    .andWhere(`(${standsOtherwise(wanted)})`)
    .setParameters({ toLifecycle: wanted.lifecycle, toApproval: wanted.approval })
    .getQueryAndParameters();
  const { affectedRows } = (await manager.query(
    `INSERT INTO standings_before (change_id, part_id, version, lifecycle, approval)
     SELECT ?, part.id, part.version + 1, part.lifecycle, part.approval
     FROM (${found}) found JOIN parts part ON part.id = found.id`,
    [id, ...(parameters as unknown[])],
  )) as { affectedRows: number };
  return affectedRows;
}

function standsOtherwise({ lifecycle, approval }: Partial<Standing>): string {
  const differences = [
    ...(lifecycle === undefined ? [] : ['part.lifecycle <> :toLifecycle']),
    ...(approval === undefined ? [] : ['part.approval <> :toApproval']),
  ];
  return differences.length === 0 ? 'FALSE' : differences.join(' OR ');
}
