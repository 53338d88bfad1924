import { Skeleton } from 'antd';

/** The place of the ranking before the first answer. */
export function GridSkeleton() {
  return (
    <div aria-busy="true" aria-label="Ranking, being made">
      <Skeleton title={false} paragraph={{ rows: 12, width: '100%' }} />
    </div>
  );
}
