interface DemoSignIn {
  readonly email: string;
  readonly password: string;
  readonly role: string;
  readonly name: string;
}

/** One password for the whole demonstration; `npm start` prints it with the addresses. */
export const DEMO_PASSWORD = 'slipway-demo-1';

const SHOP = 'merganser.test';

export const demoSignIns: readonly DemoSignIn[] = [
  { email: `liv@${SHOP}`, password: DEMO_PASSWORD, role: 'lead', name: 'Liv Sandvik' },
  { email: `amos@${SHOP}`, password: DEMO_PASSWORD, role: 'inspector', name: 'Amos Teller' },
  { email: `petra@${SHOP}`, password: DEMO_PASSWORD, role: 'office', name: 'Petra Lindqvist' },
  { email: `jun@${SHOP}`, password: DEMO_PASSWORD, role: 'admin', name: 'Jun Okabe' },
  { email: `ada@${SHOP}`, password: DEMO_PASSWORD, role: 'auditor', name: 'Ada Fennimore' },
  { email: 'desk@galena-thermal.test', password: DEMO_PASSWORD, role: 'processor', name: 'Runa Holt' },
  {
    email: 'owner@larkspur.test',
    password: DEMO_PASSWORD,
    role: 'every role, second shop',
    name: 'Corin Vale',
  },
];
