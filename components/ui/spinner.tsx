/** Something is under way: a cutter's circle turning. With reduced motion it stands still. */
export function Spinner({ size = 18 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" fill="none" stroke="currentColor" aria-hidden>
      <circle cx="12" cy="12" r="8.5" strokeWidth="1.75" opacity="0.35" />
      <g className="origin-center animate-spin">
        <path d="M12 3.500a8.5 8.5 0 0 1 8.5 8.5" strokeWidth="2.5" />
      </g>
    </svg>
  );
}
