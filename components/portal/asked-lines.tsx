import { Caution } from '@/components/ui/edge';
import { LoadNumber } from '@/components/ui/frame-number';
import { dayWords, type Clock } from '@/lib/day-words';
import { limitWords } from '@/lib/parts/limit-words';
import type { PortalBatch, PortalLine } from '@/lib/portal/contract';

/** What is asked, line by line, and the papers that say it whole. Once it is acknowledged the page is about what comes next. */
export function AskedLines({ batch, clock, folded }: { batch: PortalBatch; clock: Clock; folded: boolean }) {
  if (!folded) {
    return (
      <div className="border-t-heavy border-ink pt-1.5 pb-3">
        <Asked batch={batch} clock={clock} />
      </div>
    );
  }
  return (
    <details className="border-t-heavy border-ink pt-1 pb-1">
      <summary className="lw-word-button">
        What is asked, {batch.lines.length} {batch.lines.length === 1 ? 'line' : 'lines'}, traveller
      </summary>
      <div className="pb-2">
        <Asked batch={batch} clock={clock} />
      </div>
    </details>
  );
}

function Asked({ batch, clock }: { batch: PortalBatch; clock: Clock }) {
  const cautions = [...new Set(batch.lines.flatMap((line) => line.note ?? []))];
  return (
    <>
      <ul aria-label="Lines">
        {batch.lines.map((line) => (
          <AskedLine key={line.id} line={line} />
        ))}
      </ul>
      {batch.note && <p className="pt-2 [overflow-wrap:anywhere] whitespace-pre-line">{batch.note}</p>}
      {cautions.length > 0 && (
        <Caution>
          {cautions.map((caution) => (
            <p key={caution} className="[overflow-wrap:anywhere]">
              {caution}
            </p>
          ))}
        </Caution>
      )}
      <ToProve batch={batch} />
      <Documents batch={batch} clock={clock} />
    </>
  );
}

function AskedLine({ line }: { line: PortalLine }) {
  const change = [line.conditionBefore, line.targetCondition].filter(Boolean).join(' to ');
  return (
    <li className="flex items-baseline gap-2.5 border-b border-rule py-1.5">
      <span className="num w-4 flex-none text-faint">{line.lineNo}</span>
      <div className="min-w-0 flex-1">
        <strong className="num [overflow-wrap:anywhere]">{line.part}</strong>
        <div className="text-second [overflow-wrap:anywhere] text-quiet">
          {[line.name, line.material, change].filter(Boolean).join(', ')}
        </div>
        <div className="text-second [overflow-wrap:anywhere] text-quiet">
          lot <span className="num">{line.lotNumber}</span>
          {line.serials.length > 0 && <>, pieces {line.serials.join(', ')}</>}
        </div>
      </div>
      {line.loadNo !== null && (
        <span className="flex flex-none items-center gap-1.5 text-second text-quiet">
          load <LoadNumber number={line.loadNo} />
        </span>
      )}
      <strong className="num flex-none text-[1.0625rem]">{line.pieces.toLocaleString('en-US')}</strong>
    </li>
  );
}

function ToProve({ batch: { requirements } }: { batch: PortalBatch }) {
  if (requirements.length === 0) return null;
  return (
    <details className="pt-2">
      <summary className="lw-word-button">What the papers must show, {requirements.length}</summary>
      <ul aria-label="What the papers must show" className="pt-1">
        {requirements.map((one) => (
          <li key={one.id} className="border-b border-rule py-1.5 [overflow-wrap:anywhere]">
            {one.lineNo !== null && <span className="text-quiet">line {one.lineNo}: </span>}
            <strong>{one.characteristic}</strong> <span className="num">{limitWords(one)}</span>
            <span className="text-source text-faint"> {one.sourceText || one.source}</span>
          </li>
        ))}
      </ul>
    </details>
  );
}

const DOCUMENT_WORDS = { traveller: 'Traveller', purchase_order: 'Purchase order' } as const;

function Documents({ batch: { documents }, clock }: { batch: PortalBatch; clock: Clock }) {
  const latest = documents.filter(
    (one, at) => documents.findIndex((other) => other.kind === one.kind) === at,
  );
  const changes = latest.find((one) => one.documentVersion > 1)?.changes ?? [];
  if (latest.length === 0) return null;
  return (
    <div className="pt-2">
      {changes.length > 0 && (
        <Caution>
          <strong>The papers were issued again.</strong> Different from before:
          <ul className="list-disc pl-5">
            {changes.map((change) => (
              <li key={change}>{change}</li>
            ))}
          </ul>
        </Caution>
      )}
      <ul aria-label="Papers to read" className="flex flex-wrap gap-x-6">
        {latest.map((one) => (
          <li key={one.id} className="py-0.5">
            {one.fileId === null ? (
              <span className="text-quiet">
                {DOCUMENT_WORDS[one.kind]} is being made; it is here in a moment
              </span>
            ) : (
              <a
                className="lw-word-button"
                href={`/api/files/${one.fileId}/content?inline=1`}
                target="_blank"
                rel="noreferrer"
              >
                {DOCUMENT_WORDS[one.kind]}
                {one.documentVersion > 1 &&
                  `, version ${one.documentVersion} of ${dayWords(new Date(one.statedAt), clock)}`}
              </a>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
