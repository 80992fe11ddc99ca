import type { ReactNode } from 'react';

interface EmptyProps {
  /** What is not here: "No lot waits for anodize." */
  says: ReactNode;
  /** What brings it: "Lots come here when their step before is done." */
  comes?: ReactNode;
  /** One text button. */
  action?: ReactNode;
}

export function Empty({ says, comes, action }: EmptyProps) {
  return (
    <p className="border-b border-rule py-3">
      <strong>{says}</strong> {comes && <span className="text-quiet">{comes}</span>} {action}
    </p>
  );
}
