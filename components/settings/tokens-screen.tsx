'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Edge } from '@/components/ui/edge';
import { Empty } from '@/components/ui/empty';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { useClock } from '@/components/session/use-me';
import { listTokens, revokeToken, type ApiToken } from '@/lib/people/token-contract';

import { TokenForm } from './token-form';

/** One's own keys for programs. */
export function TokensScreen() {
  const { data } = useRead(listTokens, {});
  const [made, setMade] = useState<{ name: string; token: string } | null>(null);
  return (
    <>
      <PageHead
        title="Tokens for programs"
        sub="A program with your token does what you may do and you chose here, in your name. Signing and paying stay yours."
      />
      <div className="flex flex-col gap-7">
        {made && <MadeToken {...made} />}
        <Section
          title="My tokens"
          note={String(data.tokens.filter((token) => token.revokedAt === null).length)}
        >
          {data.tokens.length === 0 ? (
            <Empty says="You have no token." comes="A program needs one to read or write in your name." />
          ) : (
            <Table
              label="My tokens"
              columns={[
                { says: 'For' },
                { says: 'Begins with' },
                { says: 'May' },
                { says: 'Last used' },
                { says: 'Ends' },
                { says: 'Action', hidden: true, right: true },
              ]}
            >
              {data.tokens.map((token) => (
                <TokenRow key={token.id} token={token} />
              ))}
            </Table>
          )}
        </Section>
        <Section title="Make a token">
          <TokenForm scopes={data.scopes} onMade={setMade} />
        </Section>
      </div>
    </>
  );
}

function MadeToken({ name, token }: { name: string; token: string }) {
  return (
    <Edge level="warn">
      <div role="status">
        <strong>{`The token for ${name}. Copy it now: it is not shown again.`}</strong>
        <p className="num py-1.5 break-all select-all" data-testid="made-token">
          {token}
        </p>
        <Button
          look="word"
          onClick={() =>
            navigator.clipboard.writeText(token).then(() => showMessage({ says: 'Token copied.' }))
          }
        >
          Copy
        </Button>
      </div>
    </Edge>
  );
}

function TokenRow({ token }: { token: ApiToken }) {
  const clock = useClock();
  const write = useWrite(revokeToken, { refreshes: [listTokens] });
  const isOver =
    token.revokedAt !== null || (token.expiresAt !== null && new Date(token.expiresAt) < clock.now);
  const revoke = () =>
    write.mutate(
      { tokenId: token.id },
      {
        onSuccess: () => showMessage({ says: `The token for ${token.name} has ended.` }),
        onError: (error) => showMessage({ says: error.message, failed: true }),
      },
    );
  return (
    <Row state={isOver ? 'off' : 'rest'}>
      <Cell strong head="For">
        {token.name}
      </Cell>
      <Cell code head="Begins with">
        {token.hint}…
      </Cell>
      <Cell head="May">
        <details>
          <summary className="cursor-pointer">{token.scopes.length} things</summary>
          {token.scopes.join(', ')}
        </details>
      </Cell>
      <Cell head="Last used">
        {token.lastUsedAt === null ? (
          <span className="text-quiet">never</span>
        ) : (
          <Moment at={new Date(token.lastUsedAt)} clock={clock} />
        )}
      </Cell>
      <Cell head="Ends">{endWords(token, clock)}</Cell>
      <Cell right>
        {!isOver && (
          <Button look="word" busy={write.isPending} onClick={revoke}>
            Revoke
            <span className="sr-only"> {token.name}</span>
          </Button>
        )}
      </Cell>
    </Row>
  );
}

function endWords({ revokedAt, expiresAt }: ApiToken, clock: ReturnType<typeof useClock>) {
  if (revokedAt !== null) return 'revoked';
  return expiresAt === null ? (
    <span className="text-quiet">when revoked</span>
  ) : (
    <Moment at={new Date(expiresAt)} clock={clock} />
  );
}
