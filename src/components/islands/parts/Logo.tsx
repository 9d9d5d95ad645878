/** The mark: a copper ring, a gap, a tin ring with a hole. */
export function Logo({ className = "size-[31px]" }: { className?: string }) {
  return (
    <svg viewBox="0 0 32 32" className={`block shrink-0 ${className}`} aria-hidden="true" focusable="false">
      <LogoRings />
    </svg>
  );
}

/** The two rings in a box of 32, for use inside another drawing. */
export function LogoRings() {
  return (
    <>
      <path
        fillRule="evenodd"
        className="fill-copper-metal"
        d="M16 1a15 15 0 1 0 0 30a15 15 0 1 0 0-30ZM16 8.2a7.8 7.8 0 1 1 0 15.6a7.8 7.8 0 1 1 0-15.6Z"
      />
      <path
        fillRule="evenodd"
        className="fill-logo-tin"
        d="M16 9.6a6.4 6.4 0 1 0 0 12.8a6.4 6.4 0 1 0 0-12.8ZM16 13.3a2.7 2.7 0 1 1 0 5.4a2.7 2.7 0 1 1 0-5.4Z"
      />
    </>
  );
}

/** Mark and name. `large` on the sign-in page. */
export function Wordmark({ large }: { large?: boolean }) {
  return (
    <span
      className={`flex items-center leading-none font-bold tracking-[-0.012em] text-ink ${large ? "gap-4 text-[1.875rem]" : "gap-2.5 text-[1.25rem]"}`}
    >
      <Logo className={large ? "size-[45px]" : "size-[30px]"} />
      Tinpenny
    </span>
  );
}
