import Link from 'next/link';
import { PortalHead } from '@/components/shell/portal-head';
import { PublicHead } from '@/components/shell/public-head';
import { MainAndSide, Section } from '@/components/ui/section';

export function DemoHeads() {
  return (
    <MainAndSide
      main={
        <Section title="Before one has signed in">
          <PublicHead>
            <Link href="/sign-in" className="lw-word-button">
              Sign in
            </Link>
          </PublicHead>
        </Section>
      }
      side={
        <Section title="On a processor's phone">
          <PortalHead shop="Tern Slip Floatworks" call={{ says: 'Call Ines', phone: '555 0117' }} />
        </Section>
      }
    />
  );
}
