import type { Fact } from '../fact';
import type { Box, Page } from '../page';
import { boxThroughProjection } from './box';

/** A box of the page as it was read, on the page as a viewer shows it: askew or at a slant, as it was filed. */
export const boxAsFiled = ({ asFiled }: Page, box: Box): Box =>
  asFiled ? boxThroughProjection(asFiled.projection, box) : box;

/** Facts with their boxes where a viewer of the file shows them. */
export function factsAsFiled(facts: readonly Fact[], pages: readonly Page[]): Fact[] {
  return facts.map((fact) => {
    const page = pages.find(({ number }) => number === fact.page);
    return page ? { ...fact, box: [...boxAsFiled(page, fact.box)] } : fact;
  });
}
