import { Button } from 'antd';
import { useRouteError } from 'react-router-dom';
import { detailOf } from '../api/problem';
import { MessagePage } from '../components/MessagePage';

/** What stands in place of a page that failed. */
export function ErrorPage() {
  const error = useRouteError();
  return (
    <MessagePage title="This page failed">
      <p>{detailOf(error)}</p>
      <Button onClick={() => window.location.reload()}>Load it again</Button>
    </MessagePage>
  );
}
