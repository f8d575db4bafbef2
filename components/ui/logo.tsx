/** Our mark: a leaf turning about its spine, face A to face B. */
export function Logo({ size = 28 }: { size?: number }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 32 32"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      aria-hidden
    >
      <path d="M14 4L3 22l10 6L29 9z" strokeLinejoin="round" />
      <path d="M14 4l-1 24" strokeLinejoin="round" />
      <path d="M13 28L29 9" strokeLinejoin="round" />
    </svg>
  );
}
