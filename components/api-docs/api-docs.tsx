import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { ReadableField, ReadableOperation } from '@/lib/api/readable-operation';

import { Preface } from './preface';

interface ApiDocsProps {
  operations: readonly ReadableOperation[];
  /** Who holds each permission, by role. */
  holders: Record<string, string>;
  address: string;
}

/** Every read and write there is, by its kind of thing. Drawn on the server; nothing of it needs a script. */
export function ApiDocs({ operations, holders, address }: ApiDocsProps) {
  const tags = [...new Set(operations.map((operation) => operation.tag))].sort();
  return (
    <>
      <PageHead
        title="The API"
        sub={`${operations.length} reads and writes. The screens use these and no others.`}
      />
      <div className="flex flex-col gap-7">
        <Preface address={address} />
        <nav aria-label="Kinds of things" className="flex flex-wrap gap-x-5 gap-y-1">
          {tags.map((tag) => (
            <a key={tag} href={`#${tag}`} className="lw-word-button">
              {tag}
            </a>
          ))}
        </nav>
        {tags.map((tag) => (
          <Section
            key={tag}
            id={tag}
            title={tag}
            note={`${operations.filter((operation) => operation.tag === tag).length}`}
          >
            {operations
              .filter((operation) => operation.tag === tag)
              .map((operation) => (
                <Operation
                  key={operation.id}
                  operation={operation}
                  holders={holders[operation.permission] ?? ''}
                />
              ))}
          </Section>
        ))}
      </div>
    </>
  );
}

const SIDES: Record<string, string> = {
  shop: '',
  portal: 'the processor’s side',
  any: 'either side',
  public: 'without sign-in where nobody is named',
};

function Operation({ operation, holders }: { operation: ReadableOperation; holders: string }) {
  const { id, method, path, summary, side, permission, input, output } = operation;
  return (
    <details id={id} className="border-b border-rule">
      <summary className="grid cursor-pointer grid-cols-[3.5rem_minmax(0,1fr)] items-baseline gap-x-3 py-2 touch:min-h-12">
        <span className="num font-semibold">{method}</span>
        <span>
          <span className="num mr-3 break-all">{path}</span>
          <span className="text-quiet">{summary}</span>
        </span>
      </summary>
      <div className="flex flex-col gap-4 pt-1 pb-5 md:pl-[4.25rem]">
        <p className="text-second">
          Permission <strong className="num">{permission}</strong>{' '}
          <span className="text-quiet">{holders}</span> {SIDES[side]}{' '}
          <span className="text-quiet">operation</span> <span className="num">{id}</span>
        </p>
        <Fields label="Goes in" fields={input} path={path} />
        <Fields label="Comes out" fields={output} path={path} />
      </div>
    </details>
  );
}

function Fields({ label, fields, path }: { label: string; fields: readonly ReadableField[]; path: string }) {
  if (fields.length === 0) return <p className="text-second text-quiet">{label}: nothing to name.</p>;
  return (
    <Table label={label} dense columns={[{ says: label }, { says: 'Kind' }, { says: 'Limits' }]}>
      {fields.map((field) => (
        <Row key={field.name}>
          <Cell code head={label}>
            {field.name}
          </Cell>
          <Cell head="Kind">
            <span className="break-words">{field.kind}</span>
          </Cell>
          <Cell head="Limits" quiet>
            {[
              path.includes(`{${field.name}}`) ? 'in the path' : '',
              field.required ? '' : 'may be left out',
              field.limits,
            ]
              .filter(Boolean)
              .join(', ')}
          </Cell>
        </Row>
      ))}
    </Table>
  );
}
