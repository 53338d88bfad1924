import { Skeleton } from 'antd';

export function PageSkeleton() {
  return (
    <div style={{ padding: '18px 20px', maxWidth: 900 }} aria-busy="true" aria-label="Loading">
      <Skeleton active={false} title={{ width: 320 }} paragraph={{ rows: 8 }} />
    </div>
  );
}
