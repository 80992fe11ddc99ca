import type { ReactNode } from 'react';
import { Edge } from './edge';

interface FailingProps {
  /** What did not happen: "The mail to Ostrow did not leave." */
  says: ReactNode;
  /** What did: "The batch is dispatched and the pieces are moved." */
  stands?: ReactNode;
  /** "We try again at 07:20, then every hour." */
  again?: ReactNode;
  /** Text buttons. */
  actions?: ReactNode;
}

export function Failing({ says, stands, again, actions }: FailingProps) {
  return (
    <Edge level="stop">
      <div role="alert">
        <strong>{says}</strong> {stands} {again}
      </div>
      {actions && <div className="mt-1 flex flex-wrap gap-x-4">{actions}</div>}
    </Edge>
  );
}
