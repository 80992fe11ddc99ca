import type { Source } from '@/lib/trade/source';
import type { TableReference } from '@/lib/trade/table';

const HOW_FOUND: Record<Source['confidence'], string> = {
  read: 'read in the source',
  'read+memory': 'partly read, partly from memory',
  computed: 'worked out from the published rule',
  memory: 'from memory, to be checked against your copy',
};

/** How a value was obtained and how far we trust it; of a shop's own edition, who entered it. */
export const trustWords = ({ confidence, certainty, enteredBy }: Source): string =>
  enteredBy === undefined
    ? `${HOW_FOUND[confidence]}; ${certainty} trust`
    : `entered by ${enteredBy} from the shop’s own copy`;

/** Where a value comes from, how it was obtained and how far we trust it. Ends whatever shows a reference value. */
export function SourceLine({ source, readFrom }: { source: Source; readFrom?: TableReference | undefined }) {
  return (
    <p className="pt-2 text-source text-quiet">
      {source.document}; {trustWords(source)}.
      {readFrom && !source.document.includes(readFrom.edition) && ` Table: ${readFrom.edition}.`}
      {source.address !== undefined && ` Seen at ${source.address}.`}
    </p>
  );
}
