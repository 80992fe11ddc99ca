import { sourceWords } from '@/lib/batches/source-words';
import type { Source } from '@/lib/trade/source';
import type { TableReference } from '@/lib/trade/table';

/** Where a value comes from, how it was obtained and how far we trust it. Ends whatever shows a reference value. */
export function SourceLine({ source, readFrom }: { source: Source; readFrom?: TableReference | undefined }) {
  return (
    <p className="pt-2 text-source [overflow-wrap:anywhere] text-quiet">
      {sourceWords(source)}.{source.confidence === 'memory' && ' Check it against your own copy.'}
      {readFrom && !source.document.includes(readFrom.edition) && ` Table: ${readFrom.edition}.`}
      {source.address !== undefined && ` Seen at ${source.address}.`}
    </p>
  );
}
