import { sizeWords } from '@/lib/files/kinds';

interface FileLinkProps {
  file: { id: string; name: string; size?: number; mediaType?: string };
  className?: string;
}

/** A kept file: a PDF or picture opens beside the page, anything else is saved. */
export function FileLink({ file, className = '' }: FileLinkProps) {
  return (
    <span className={`[overflow-wrap:anywhere] ${className}`}>
      <a
        href={`/api/files/${file.id}/content?inline=1`}
        target="_blank"
        rel="noreferrer"
        className="font-medium"
      >
        {file.name}
      </a>
      {file.size !== undefined && <span className="text-quiet"> {sizeWords(file.size)}</span>}
    </span>
  );
}
