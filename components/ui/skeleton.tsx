type SkeletonProps = { label: string; lines?: number };

/** Holds the place of what is being fetched, without moving. */
export function Skeleton({ label, lines = 3 }: SkeletonProps) {
  return (
    <div role="status" className="flex flex-col gap-3">
      <p className="text-15 text-ink-soft">{label}</p>
      {Array.from({ length: lines }, (_, index) => (
        <div
          key={index}
          aria-hidden="true"
          className="h-5 bg-rule"
          style={{ width: `${92 - (index % 3) * 14}%` }}
        />
      ))}
    </div>
  );
}
