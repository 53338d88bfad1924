import { Link } from 'react-router-dom';
import { MessagePage } from '../components/MessagePage';
import { START_PAGE } from './navigation';

export function NotFoundPage() {
  return (
    <MessagePage title="There is no such page">
      <p>
        The address may be mistyped, or the page is gone. <Link to={START_PAGE}>Go to the ranking</Link>.
      </p>
    </MessagePage>
  );
}
