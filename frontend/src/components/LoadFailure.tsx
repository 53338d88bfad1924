import { Button } from 'antd';
import { detailOf } from '../api/problem';

interface LoadFailureProps {
  error: unknown;
  onRetry: () => unknown;
  className?: string;
}

/** Says why something could not be loaded, and offers to ask again. */
export function LoadFailure({ error, onRetry, className }: LoadFailureProps) {
  return (
    <p role="alert" className={className}>
      {detailOf(error)} <Button onClick={() => void onRetry()}>Try again</Button>
    </p>
  );
}
