import { ButtonLink } from '@/components/ui/button';

/** Not yours and not there are one sentence, so that nothing can be guessed from the difference. */
export function NotYours() {
  return (
    <>
      <h1>You may not see this page</h1>
      <p className="py-3 text-quiet">It belongs to another shop, or it does not exist.</p>
      <ButtonLink href="/">To the tideline</ButtonLink>
    </>
  );
}
