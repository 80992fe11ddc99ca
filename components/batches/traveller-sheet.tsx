import type { TravellerSays } from '@/lib/batches/paper-contract';
import { dayWords } from '@/lib/day-words';
import { limitWords } from '@/lib/parts/limit-words';
import { linesWords } from '@/lib/parts/lines-words';
import { PROCESS_WORDS } from '@/lib/trade/process';

// Paper outlives its year, so it names it: seen from here no day is of this year.
const ALWAYS_WITH_YEAR = new Date(0);

/** What the traveller says, on a white sheet: small beside the batch, large on its own page. The printed one is made from the same words. */
export function TravellerSheet({ says, small = false }: { says: TravellerSays; small?: boolean }) {
  const day = (when: string) => dayWords(when, { zone: says.zone, now: ALWAYS_WITH_YEAR });
  const pieces = says.lines.reduce((sum, line) => sum + line.pieces, 0);
  const version = says.documentVersion === 0 ? 'draft' : `version ${says.documentVersion}`;
  return (
    <div
      className={`lw-sheet border border-rule bg-white text-[#1e2326] ${small ? 'p-3 text-[9px] leading-3' : 'mx-auto max-w-[816px] p-4 text-row md:p-9'}`}
    >
      <div className="flex flex-wrap items-center border-heavy border-current px-3 py-1">
        <span className={`rounded-full border-heavy border-current ${small ? 'size-2.5' : 'size-6'}`} />
        <span
          className={`pl-3 font-mono font-semibold whitespace-nowrap ${small ? 'text-[15px]' : 'text-[1.7rem] leading-10 md:text-[2.2rem]'}`}
        >
          {says.number}
        </span>
        <span
          className={`ml-auto font-cond ${small ? 'text-[10px]' : 'text-word'}`}
        >{`Traveller, ${version}`}</span>
      </div>
      <p className={small ? 'mt-1.5' : 'mt-4'}>
        <span className="font-semibold">{says.processor.name}</span>, from {says.shop.name}. Order{' '}
        <span className="font-mono">{says.orderNumber}</span>.
        {says.wantedBackOn && ` Wanted back ${day(says.wantedBackOn)}.`}
        <br />
        {PROCESS_WORDS[says.process]}, {says.specification}. {pieces.toLocaleString('en-US')} pieces.
      </p>
      {says.changes.length > 0 && (
        <p className="mt-2 border-l-4 border-current pl-2">{`Different from version ${says.documentVersion - 1}: ${says.changes.join('; ').replace(/\.$/, '')}.`}</p>
      )}
      <SheetLines lines={says.lines} small={small} />
      {says.note && <p className="mt-2">{says.note}</p>}
      <div className={small ? 'mt-1.5' : 'mt-5 grid gap-6 md:grid-cols-2'}>
        {says.furnaceLoads?.loads.map((load) => (
          <SheetList
            key={`${load.number} ${load.lines.join()}`}
            title={`Load ${load.number}${says.furnaceLoads?.areSet ? '' : ', as planned'}, ${linesWords(load.lines)}`}
            small={small}
            items={load.rows.map(({ name, says: what, rest }) =>
              [`${name}: ${what}`, rest].filter(Boolean).join(', '),
            )}
          />
        ))}
        {says.furnaceLoads && says.furnaceLoads.apart.length > 0 && (
          <SheetList title="The loads may not be joined" small={small} items={says.furnaceLoads.apart} />
        )}
        {says.samples && says.samples.length > 0 && (
          <SheetList
            title="Samples"
            small={small}
            items={says.samples.map(
              ({ lineNo, inspect, pieces: of, says: what, plan }) =>
                `line ${lineNo}: ${inspect} of ${of}, ${what}${small ? '' : ` (${plan})`}`,
            )}
          />
        )}
        <SheetList
          title="Must be proved"
          small={small}
          items={says.requirements.map((one) =>
            [`${one.characteristic} ${limitWords(one)}`, linesWords(one.lines)].filter(Boolean).join(', '),
          )}
        />
        {says.orderStates !== undefined && says.orderStates.length > 0 && (
          <SheetList
            title="The order states"
            small={small}
            items={says.orderStates.map((one) =>
              [`${one.item}: ${one.says}`, linesWords(one.lines)].filter(Boolean).join(', '),
            )}
          />
        )}
        <SheetList
          title="Cautions"
          small={small}
          items={[
            ...says.cautions,
            ...says.overrides.map((one) => `Let pass: ${one.what}. ${one.reason} ${one.by}.`),
          ]}
        />
      </div>
      {!small && (
        <p className="mt-5 text-source">
          The drawing, the order and the governing specification at the revision named come first, then this
          page. It releases nothing by itself.
          {says.furnaceLoads &&
            ` Figures of the loads are reference values, and what must be proved goes before them: ${says.furnaceLoads.sources.join('; ')}.`}
        </p>
      )}
    </div>
  );
}

/** Where a sheet is too narrow for columns, each line is a block of its own. */
const ROW =
  'max-md:flex max-md:flex-wrap max-md:gap-x-4 max-md:border-b max-md:border-current/20 max-md:py-2';

function SheetLines({ lines, small }: { lines: TravellerSays['lines']; small: boolean }) {
  const cell = small
    ? 'py-px pr-1.5'
    : 'py-1.5 pr-3 max-md:block max-md:p-0 max-md:empty:hidden md:border-b md:border-current/20';
  return (
    <div className="overflow-x-auto">
      <table
        className={`w-full text-left ${small ? 'mt-1.5 text-[8.5px] leading-[10px]' : 'mt-4 max-md:block max-md:border-t max-md:border-current'}`}
      >
        {!small && (
          <thead className="max-md:sr-only">
            <tr className="border-b border-current font-cond text-caption">
              {['', 'Lot', 'Part and revision', '', 'Material, heat', 'Thickness', 'From, to', 'Pieces'].map(
                (name, at) => (
                  <th key={at} scope="col" className="pr-3 font-normal">
                    {name || <span className="sr-only">{at === 0 ? 'Line' : 'Name'}</span>}
                  </th>
                ),
              )}
            </tr>
          </thead>
        )}
        <tbody className={small ? '' : 'max-md:block'}>
          {lines.map((line) => (
            <tr key={line.lineNo} className={small ? '' : ROW}>
              <td className={`${cell} font-mono whitespace-nowrap`}>{line.lineNo}</td>
              <td className={`${cell} font-mono whitespace-nowrap`}>{line.lotNumber}</td>
              <td
                className={`${cell} font-mono [overflow-wrap:anywhere]`}
              >{`${line.partNumber} ${line.partRevision}`}</td>
              <td className={cell}>{line.partName}</td>
              {!small && (
                <td className={cell}>
                  {line.material} <span className="font-mono">{line.heat}</span>
                </td>
              )}
              <td className={`${cell} font-mono whitespace-nowrap`}>{line.thickness}</td>
              <td className={`${cell} font-mono whitespace-nowrap`}>
                {[line.conditionBefore, line.targetCondition].filter(Boolean).join(small ? '-' : ' to ')}
              </td>
              <td className={`${cell} text-right font-mono whitespace-nowrap`}>
                {line.pieces}
                {!small && <span className="md:sr-only"> pc</span>}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function SheetList({ title, items, small }: { title: string; items: readonly string[]; small: boolean }) {
  if (small) {
    return (
      <p>
        <span className="font-semibold">{title}:</span>{' '}
        {items.map((item) => (item.endsWith('.') ? item : `${item}.`)).join(' ')}
      </p>
    );
  }
  return (
    <div>
      <h3 className="border-t-heavy border-current pt-1">{title}</h3>
      <ul>
        {items.map((item) => (
          <li key={item} className="border-b border-current/20 py-1">
            {item}
          </li>
        ))}
      </ul>
    </div>
  );
}
