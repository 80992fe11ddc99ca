import type { FunctionComponent } from 'react';

import {
  InvitationMail,
  invitationSubject,
  ResetMail,
  resetSubject,
  SignInMail,
  signInSubject,
} from './account';
import { BatchCancelledMail, batchCancelledSubject } from './batch-cancelled';
import { BatchLinkMail, batchLinkSubject } from './batch-link';
import { DispatchMail, dispatchSubject, reissuedSubject } from './dispatch';
import { InvoiceRefusedMail, invoiceRefusedSubject } from './invoice-refused';
import type { MailProps, MailTemplate } from './mail-props';
import { MessageMail, messageSubject } from './message';
import { RemittanceMail, remittanceSubject } from './remittance';

interface Template<T extends MailTemplate> {
  subject(props: MailProps<T>): string;
  component: FunctionComponent<MailProps<T>>;
}

/** Every mail there is: what its subject says and how it looks. What each is told stands in `mail-props.ts`. */
export const ALL_TEMPLATES: { [T in MailTemplate]: Template<T> } = {
  dispatch: { subject: dispatchSubject, component: DispatchMail },
  'dispatch-reissued': { subject: reissuedSubject, component: DispatchMail },
  'batch-cancelled': { subject: batchCancelledSubject, component: BatchCancelledMail },
  'batch-link': { subject: batchLinkSubject, component: BatchLinkMail },
  message: { subject: messageSubject, component: MessageMail },
  trouble: { subject: messageSubject, component: MessageMail },
  remittance: { subject: remittanceSubject, component: RemittanceMail },
  'invoice-refused': { subject: invoiceRefusedSubject, component: InvoiceRefusedMail },
  invitation: { subject: invitationSubject, component: InvitationMail },
  reset: { subject: resetSubject, component: ResetMail },
  'sign-in': { subject: signInSubject, component: SignInMail },
};
