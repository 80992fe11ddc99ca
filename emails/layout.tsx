import { Body, Head, Html, Preview } from '@react-email/components';
import type { ReactNode } from 'react';

import type { Stage } from '@/lib/batches/stage';

import { COLOURS, COND, MONO, SANS, STAGE_LOOK } from './look';

interface LayoutProps {
  /** What an inbox shows beside the subject. */
  preview: string;
  /** The batch it is about. */
  batch?: { number: string; stage: Stage } | undefined;
  title: string;
  children: ReactNode;
  /** In small print at the end. */
  foot?: ReactNode;
}

/** One column of 600 px made of tables, because that is all that mail programs agree on. */
export function MailLayout({ preview, batch, title, children, foot }: LayoutProps) {
  return (
    <Html lang="en">
      <Head>
        <meta name="color-scheme" content="light" />
      </Head>
      <Preview data-skip-in-text="true">{preview}</Preview>
      <Body style={{ margin: 0, padding: 0, backgroundColor: '#FFFFFF' }}>
        <table
          role="presentation"
          align="center"
          width="600"
          cellPadding={0}
          cellSpacing={0}
          style={{
            width: '100%',
            maxWidth: 600,
            borderCollapse: 'collapse',
            background: COLOURS.paper,
            font: `15px/22px ${SANS}`,
            color: COLOURS.ink,
          }}
        >
          <tbody>
            <tr>
              <td style={{ padding: '20px 28px' }}>
                {batch && <MailTag {...batch} />}
                <h1 style={{ margin: batch ? '16px 0 6px' : '0 0 6px', font: `700 25px/30px ${COND}` }}>
                  {title}
                </h1>
                {children}
                <div
                  style={{
                    margin: '18px 0 0',
                    paddingTop: 9,
                    borderTop: `1px solid ${COLOURS.rule}`,
                    font: `12.5px/18px ${SANS}`,
                    color: COLOURS.quiet,
                  }}
                >
                  {foot ?? 'Sent by Lotwright.'}
                </div>
              </td>
            </tr>
          </tbody>
        </table>
      </Body>
    </Html>
  );
}

/** The tag as two cells: the eye and the number with its word. */
function MailTag({ number, stage }: { number: string; stage: Stage }) {
  const { edge, ink, wash, mark, word } = STAGE_LOOK[stage];
  return (
    <table
      role="presentation"
      cellPadding={0}
      cellSpacing={0}
      style={{ borderCollapse: 'collapse', width: 'auto' }}
    >
      <tbody>
        <tr>
          <td
            data-skip-in-text="true"
            style={{
              width: 40,
              height: 44,
              padding: 0,
              border: `2px solid ${ink}`,
              borderRight: 0,
              background: edge,
              textAlign: 'center',
              verticalAlign: 'middle',
            }}
          >
            <span
              style={{
                display: 'inline-block',
                width: 13,
                height: 13,
                border: `1.5px solid ${ink}`,
                borderRadius: '50%',
                background: COLOURS.paper,
                verticalAlign: 'middle',
              }}
            />
          </td>
          <td
            style={{
              padding: '0 16px',
              border: `2px solid ${ink}`,
              background: wash,
              verticalAlign: 'middle',
              font: `600 22px/40px ${MONO}`,
              letterSpacing: '-0.03em',
              whiteSpace: 'nowrap',
            }}
          >
            {number}{' '}
            <span style={{ font: `600 15px/40px ${COND}`, letterSpacing: 0, color: ink }}>
              <span data-skip-in-text="true">{mark} </span>
              {word}
            </span>
          </td>
        </tr>
      </tbody>
    </table>
  );
}
