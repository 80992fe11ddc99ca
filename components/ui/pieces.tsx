interface PiecesProps {
  count: number;
  /** "38 of 41" */
  of?: number;
  className?: string;
}

/** `41 pc`, `38 of 41` */
export function Pieces({ count, of, className = '' }: PiecesProps) {
  return (
    <span className={`whitespace-nowrap ${className}`}>
      <span className="num">{count.toLocaleString('en-US')}</span>
      {of === undefined ? (
        ' pc'
      ) : (
        <>
          {' of '}
          <span className="num">{of.toLocaleString('en-US')}</span>
        </>
      )}
    </span>
  );
}
