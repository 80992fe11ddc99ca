import { BrandMark } from '@/components/ui/marks';

interface PortalHeadProps {
  shop: string;
  /** Whom to ring: first name and number. */
  call?: { says: string; phone: string } | undefined;
}

/** The processor's side of a mailed link: whose work it is, and one press to ring them. */
export function PortalHead({ shop, call }: PortalHeadProps) {
  return (
    <header className="lw-head flex min-h-12 items-center gap-2.5 border-b-heavy border-ink px-4 font-cond text-sub md:px-6">
      <BrandMark height={18} />
      <span>{shop}</span>
      {call && (
        <a href={`tel:${call.phone.replaceAll(/[^+\d]/g, '')}`} className="lw-word-button ml-auto">
          {call.says}
        </a>
      )}
    </header>
  );
}
