import { Pagination } from 'antd';
import { grouped } from './countOf';

interface PagesProps {
  page: number;
  pageSize: number;
  total: number;
  onChange: (page: number) => void;
  className?: string;
}

/** Leads through a list that has more than one page, and says which of its entries are shown. */
export function Pages({ page, pageSize, total, onChange, className }: PagesProps) {
  if (total <= pageSize) return null;
  return (
    <Pagination
      size="small"
      className={className}
      current={page}
      pageSize={pageSize}
      total={total}
      showSizeChanger={false}
      showTotal={(all, [from, to]) => `${grouped(from)}–${grouped(to)} of ${grouped(all)}`}
      onChange={onChange}
    />
  );
}
