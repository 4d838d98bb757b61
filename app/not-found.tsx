import Link from 'next/link';
import { Door } from '@/components/shell/door';

export default function NotFound() {
  return (
    <Door title="There is no such page">
      <p>The address may have a slip in it, or what it led to is not yours to see.</p>
      <p className="mt-3">
        <Link href="/">Go to your office</Link>
      </p>
    </Door>
  );
}
