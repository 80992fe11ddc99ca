import type { ProductForm } from '@/lib/trade/process';

/** `2024 clad sheet` */
export const materialWords = ({
  alloy,
  clad,
  form,
}: {
  alloy: string;
  clad: boolean;
  form: ProductForm;
}): string => `${alloy}${clad ? ' clad' : ''} ${form}`;
