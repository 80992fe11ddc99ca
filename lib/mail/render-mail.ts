import { render, toPlainText } from '@react-email/render';
import { createElement, type FunctionComponent } from 'react';

import { ALL_TEMPLATES } from '@/emails/all-templates';
import { MAIL_PROPS, type MailProps, type MailTemplate } from '@/emails/mail-props';

interface RenderedMail {
  subject: string;
  html: string;
  text: string;
}

/** Both parts of a mail out of the same component, so that they cannot come to say different things. */
export async function renderMail<T extends MailTemplate>(template: T, given: unknown): Promise<RenderedMail> {
  const props = MAIL_PROPS[template].parse(given) as MailProps<T>;
  const { subject, component } = ALL_TEMPLATES[template];
  const html = await render(createElement(component as FunctionComponent<object>, props));
  return { subject: oneLine(subject(props)), html, text: toPlainText(html, TEXT) };
}

const TEXT: Parameters<typeof toPlainText>[1] = {
  wordwrap: 78,
  selectors: [
    { selector: 'h1', format: 'heading', options: { uppercase: false } },
    {
      selector: '[data-text-format="dataTable"]',
      format: 'dataTable',
      options: { uppercaseHeaderCells: false, maxColumnWidth: 38, colSpacing: 2 },
    },
  ],
};

/** A name with a line break in it must not become a header of its own. */
const oneLine = (text: string): string => text.replaceAll(/\s+/g, ' ').trim();
