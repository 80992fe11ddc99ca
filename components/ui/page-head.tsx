import type { ReactNode } from 'react';

interface PageHeadProps {
  /** Either the tag of a batch (46 px), or a title. */
  tag?: ReactNode;
  title?: ReactNode;
  /** One line under the title. */
  sub?: ReactNode;
  /** `<TitleCells>` beside the tag or the title. */
  cells?: ReactNode;
  /** At the right, one of them primary. */
  actions?: ReactNode;
}

/** The title block of a page. */
export function PageHead({ tag, title, sub, cells, actions }: PageHeadProps) {
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-3 pt-4 pb-3.5">
      {tag}
      {(title || sub) && (
        <div className="min-w-0">
          {title && <h1 className="text-balance">{title}</h1>}
          {sub && <p className="text-second leading-5 text-quiet">{sub}</p>}
        </div>
      )}
      {cells}
      {actions && (
        <div className="ml-auto flex flex-wrap items-center gap-2.5 max-md:ml-0 max-md:w-full">{actions}</div>
      )}
    </div>
  );
}
