import Link from 'next/link';
import { Message } from '@/components/frame/Message';

export default function NotFound() {
  return (
    <Message title="There is nothing here">
      <p>
        Either the address is wrong, or it belongs to a show that you are not a member of. Ask an
        administrator of the show if you need to see it.
      </p>
      <p>
        <Link className="plain-action" href="/shows">
          Back to your shows
        </Link>
      </p>
    </Message>
  );
}
