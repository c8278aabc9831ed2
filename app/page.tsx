import { redirect } from 'next/navigation';

/** Work begins with the shows. */
export default function StartPage(): never {
  redirect('/shows');
}
