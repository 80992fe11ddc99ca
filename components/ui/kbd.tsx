/** One cap for each key: `<Kbd keys="J K" />`. */
export function Kbd({ keys, says }: { keys: string; says?: string }) {
  return (
    <span className="inline-flex items-center gap-1 whitespace-nowrap touch:hidden">
      {keys.split(' ').map((key) => (
        <kbd key={key}>{key}</kbd>
      ))}
      {says && <span className="ml-1 text-second">{says}</span>}
    </span>
  );
}
