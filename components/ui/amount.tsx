import { amountText } from '@/lib/money';

interface AmountProps {
  /** Minor units. */
  minor: number;
  /** Only where no head names it. */
  currency?: string;
  className?: string;
}

/** `282.40`; the currency stands in the head of the column. */
export function Amount({ minor, currency, className = '' }: AmountProps) {
  return (
    <span className={`num whitespace-nowrap ${className}`}>
      {amountText(minor)}
      {currency && ` ${currency}`}
    </span>
  );
}
