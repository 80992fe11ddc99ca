import type { OpenedFile, Page } from '../../page';
import type { CertificateLine, Cycle, Reading, StatedCertificate } from '../certificate';
import { mostBelieved, type Candidate, type Chosen } from './candidates';
import { certificateDates } from './certificate-date';
import { alloys, classTypes, conditions, designation } from './class-type';
import { FactCollector } from './collect-facts';
import type { ReadCycle, ReadValue } from './cycle-times';
import { readCycles } from './cycles';
import { BATCH, CERTIFICATE_NUMBER, codesFor, PURCHASE_ORDER, sameCode } from './identity';
import type { ReadCell, ReadLine } from './line-cells';
import { acceptedOf, readLines } from './lines';
import { readNdt, type NdtField } from './ndt';
import { paperOf, type Paper } from './paper';
import { equipment, sampleSizes } from './equipment';
import { platingEnds, quenchDelays, quenchMedia } from './plating-and-quench';
import { processesOf } from './process';
import { processors } from './processor';
import { readReadings, type ReadReading } from './readings';
import { readSignature, signers, signerTitles } from './signature';
import { sameSpecification, specifications, type SpecificationRead } from './specification';
import { splitCertificates } from './split-certificates';
import { readStatement } from './statement';

/**
 * What the certificates of an opened file state, one entry for each certificate in the order of the pages.
 *
 * Only what a person can see is read. A value that is not stated, or cannot be told, is null; one that is there and cannot be
 * told (03/04/2026) has a fact with its words. Temperatures in the unit printed, minutes, seconds.
 */
export function statedIn(opened: OpenedFile): StatedCertificate[] {
  return splitCertificates(opened.pages).map(statedOn);
}

function statedOn(pages: readonly Page[]): StatedCertificate {
  const paper = paperOf(pages);
  const facts = new FactCollector();
  const specification = mostBelieved(specifications(paper), sameSpecification);
  const process = mostBelieved(processesOf(paper, specification));
  const behind = specification ? { rest: restOf(paper, specification), spot: specification.spot } : null;
  const classType = mostBelieved(classTypes(paper, behind), sameWords);
  const cycles = readCycles(paper, process?.value ?? null);
  const signature = readSignature(paper);
  const statement = readStatement(paper);
  const chosen = <Value extends string | number | null>(
    field: string,
    candidates: readonly Candidate<Value>[],
    same?: (a: Value, b: Value) => boolean,
  ): Value | null => facts.note(field, mostBelieved(candidates, same));
  return {
    processor: chosen('processor', processors(paper), sameWords),
    certificate_number: chosen('certificate_number', codesFor(paper, CERTIFICATE_NUMBER), sameCode),
    certificate_date: chosen('certificate_date', certificateDates(paper)),
    purchase_order: chosen('purchase_order', codesFor(paper, PURCHASE_ORDER), sameCode),
    batch: chosen('batch', codesFor(paper, BATCH), sameCode),
    process: facts.note('process', process),
    specification: facts.note(
      'specification',
      specification && { ...specification, value: specification.value.number },
    ),
    specification_revision: facts.note('specification_revision', revisionOf(paper, specification)),
    class_type: facts.note('class_type', classType),
    alloy: chosen('alloy', alloys(paper), sameCode),
    condition: chosen('condition', conditions(paper, classType?.value ?? null), sameCode),
    lines: readLines(paper).map((line, index) => statedLine(line, index, facts)),
    cycles: cycles.map((cycle, index) => statedCycle(cycle, index, facts)),
    quench_medium: chosen('quench_medium', quenchMedia(paper)),
    quench_delay_s: chosen('quench_delay_s', quenchDelays(paper)),
    plating_end: chosen('plating_end', platingEnds(paper)),
    bake_start: facts.note('bake_start', believed(bakeOf(cycles)?.start)),
    bake_end: facts.note('bake_end', believed(bakeOf(cycles)?.end)),
    readings: readReadings(paper).map((reading, index) => statedReading(reading, index, facts)),
    ndt: statedNdt(readNdt(paper, process?.value ?? null), facts),
    sample_size: chosen('sample_size', sampleSizes(paper)),
    furnace: chosen('furnace', equipment(paper, 'furnace'), sameWords),
    load: chosen('load', equipment(paper, 'load'), sameWords),
    signature_present:
      facts.note('signature_present', {
        value: signature.present,
        spot: signature.spot,
        belief: signature.belief,
      }) ?? false,
    signed_by: chosen('signed_by', signers(paper), sameWords),
    signer_title: chosen('signer_title', signerTitles(paper), sameWords),
    conformance_statement:
      facts.note('conformance_statement', {
        value: statement.present,
        spot: statement.present ? statement.spot : null,
        belief: statement.belief,
      }) ?? false,
    facts: facts.facts,
  };
}

const sameWords = (a: string, b: string): boolean => plain(a) === plain(b);
const plain = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '');

const bakeOf = (cycles: readonly ReadCycle[]): ReadCycle | undefined =>
  cycles.find(({ step }) => step === 'embrittlement_relief');

/** A value that one place gives, as far as that place is believed and can be read. */
function believed<Value>(
  read: ReadValue<Value> | ReadCell<Value> | undefined | null,
): (ReadValue<Value> & { belief: number }) | null {
  return read ? { ...read, belief: read.trust * (0.4 + 0.6 * read.spot.legible) } : null;
}

/** What stands behind the specification's number, wherever it is named with something behind it. */
function restOf(paper: Paper, chosen: Chosen<SpecificationRead>): string {
  const said = ({ rest }: SpecificationRead): number => designation(rest)?.length ?? 0;
  const same = specifications(paper).filter(({ value }) => sameSpecification(value, chosen.value));
  // A label's value ends with its line, a sentence does not.
  const [longest] = same.map(({ value }) => value).sort((a, b) => said(b) - said(a));
  return longest && said(longest) > 0 ? longest.rest : chosen.value.rest;
}

/** The revision may be named only in one of the places that name the specification. */
function revisionOf(paper: Paper, specification: Chosen<SpecificationRead> | null): Chosen<string> | null {
  if (!specification) return null;
  const named = specifications(paper).flatMap((one) =>
    sameSpecification(one.value, specification.value) && one.value.revision !== null
      ? [{ ...one, value: one.value.revision }]
      : [],
  );
  return mostBelieved(named);
}

function statedLine(line: ReadLine, index: number, facts: FactCollector): CertificateLine {
  const note = <Value extends string | number>(
    field: string,
    read: ReadCell<Value> | null | undefined,
  ): Value | null => facts.note(`lines[${index}].${field}`, believed(read));
  const { serials } = line;
  if (serials)
    facts.note(`lines[${index}].serials`, believed({ ...serials, value: serials.value.join(', ') }));
  if (line.heat) facts.note(`lines[${index}].heat`, believed(line.heat));
  if (line.received) facts.note(`lines[${index}].qty_received`, believed(line.received));
  return {
    part_number: note('part_number', line.part),
    rev: note('rev', line.rev),
    qty_accepted: note('qty_accepted', acceptedOf(line)),
    qty_rejected: note('qty_rejected', line.rejected),
    material: note('material', line.material),
    lot: note('lot', line.lot),
    ...(serials && { serials: [...serials.value] }),
  };
}

function statedCycle(cycle: ReadCycle, index: number, facts: FactCollector): Cycle {
  const field = (name: string): string => `cycles[${index}].${name}`;
  const { temperature, unit, minutes, start, end } = cycle;
  const setTemperature = temperature && believed(temperature);
  return {
    step: cycle.step,
    set_temp: facts.note(field('set_temp'), setTemperature ? { ...setTemperature, unit } : null),
    unit: unit ?? null,
    soak_start: facts.note(field('soak_start'), believed(start)),
    soak_end: facts.note(field('soak_end'), believed(end)),
    minutes: facts.note(field('minutes'), believed(minutes)),
  };
}

function statedReading(
  { kind, unit, values, spot, trust }: ReadReading,
  index: number,
  facts: FactCollector,
): Reading {
  facts.note(`readings[${index}].values`, {
    value: values.join('; '),
    spot,
    belief: trust * (0.4 + 0.6 * spot.legible),
    unit: unit ?? undefined,
  });
  return { kind, unit, values: [...values] };
}

function statedNdt(
  read: Record<NdtField, Chosen<string> | null> | null,
  facts: FactCollector,
): StatedCertificate['ndt'] {
  if (!read) return null;
  const note = (field: NdtField): string | null => facts.note(`ndt.${field}`, read[field]);
  return {
    method: note('method'),
    type: note('type'),
    sensitivity: note('sensitivity'),
    result: note('result'),
    personnel_level: note('personnel_level'),
  };
}
