import { Skeleton } from 'antd';
import { detailOf } from '../../api/problem';

/** What stands where a link in an e-mail is being read, or is of no use. */
export function BadLink({ error }: { error: Error | null }) {
  if (error === null) return <Skeleton title={false} paragraph={{ rows: 3 }} />;
  return <p role="alert">{detailOf(error)}</p>;
}
