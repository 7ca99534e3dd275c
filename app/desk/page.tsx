import { redirect } from 'next/navigation';
import { chooseMeet, enterDesk } from './enter';

/** The desk opens with the line of the current meet; before the first meet, with the meets. */
export default async function Desk() {
  await enterDesk('/desk');
  const { meet } = await chooseMeet(undefined);
  redirect(meet ? `/desk/line/${meet.slug}` : '/desk/meets');
}
