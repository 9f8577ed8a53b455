/** The look of everything that is typed into or chosen from. Larger letters under a finger keep phones from zooming. */
export const controlStyle =
  "touch-target w-full min-w-0 rounded-control border border-edge bg-raised px-2.5 py-1.5 text-ink pointer-coarse:text-large hover:not-disabled:border-ink-2 aria-invalid:border-out aria-invalid:shadow-[inset_0_0_0_1px_var(--color-out)] disabled:border-hair disabled:bg-ground disabled:text-ink-2 [&:read-only:not(select)]:bg-ground";
