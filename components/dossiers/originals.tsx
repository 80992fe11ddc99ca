import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { DossierEvidence } from '@/lib/dossiers/contract';
import { mayBeShownInline, sizeWords } from '@/lib/files/kinds';

interface OriginalsProps {
  evidence: DossierEvidence;
  filesAt: string;
  filesEnd: string;
}

/** Every file as it was received, with the hash by which anybody can tell that it still is. */
export function Originals({ evidence: { files, auditHead }, filesAt, filesEnd }: OriginalsProps) {
  return (
    <Section
      title="Originals, kept as received"
      note={`${files.length} ${files.length === 1 ? 'file' : 'files'}`}
    >
      {files.length === 0 && <p className="py-3 text-quiet">No file came with this lot or its batches.</p>}
      {files.length > 0 && (
        <Table
          label="Originals"
          columns={[
            { says: 'File' },
            { says: 'What it is' },
            { says: 'Size', right: true },
            { says: 'SHA-256' },
            { says: 'Keep it', hidden: true },
          ]}
          dense
        >
          {files.map((file) => (
            <Row key={file.id}>
              <Cell>
                {mayBeShownInline(file.mediaType) ? (
                  <a
                    href={`${filesAt}${file.id}${filesEnd}?inline=1`}
                    target="_blank"
                    rel="noreferrer"
                    className="font-medium [overflow-wrap:anywhere]"
                  >
                    {file.name}
                  </a>
                ) : (
                  <span className="font-medium [overflow-wrap:anywhere]">{file.name}</span>
                )}
              </Cell>
              <Cell>
                {file.purpose.replaceAll('_', ' ')}
                {file.batchNumber && (
                  <>
                    {' of '}
                    <span className="num">{file.batchNumber}</span>
                  </>
                )}
              </Cell>
              <Cell figure head="Size" className="whitespace-nowrap">
                {sizeWords(file.size)}
              </Cell>
              <Cell code head="SHA-256" className="max-w-64 break-all">
                {file.sha256}
              </Cell>
              <Cell right>
                <a href={`${filesAt}${file.id}${filesEnd}`} className="lw-word-button">
                  Keep<span className="sr-only"> {file.name}</span>
                </a>
              </Cell>
            </Row>
          ))}
        </Table>
      )}
      {auditHead && (
        <p className="pt-2 text-source text-quiet">
          The shop’s audit trail stood at entry <span className="num">{auditHead.seq}</span>, hash{' '}
          <span className="num break-all">{auditHead.hash}</span>, when this was read.
        </p>
      )}
    </Section>
  );
}
