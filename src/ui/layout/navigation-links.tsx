"use client";
import Link from "next/link";
import { usePathname } from "next/navigation";
import { classNames } from "../class-names";
import { currentHref, type NavigationBadge, type NavigationItem } from "./navigation";

type Props = { items: readonly NavigationItem[]; onNavigate?: () => void; large?: boolean };

export function NavigationLinks({ items, onNavigate, large = false }: Props) {
  const current = currentHref(items, usePathname());
  return (
    <ul className="flex flex-col gap-0.5">
      {items.map(({ href, label, badge }) => (
        <li key={href}>
          <Link
            href={href}
            onClick={onNavigate}
            aria-current={href === current ? "page" : undefined}
            className={classNames(
              "touch-target flex items-center justify-between rounded-control px-2.5 no-underline",
              large ? "py-2.5 text-large" : "py-1.5",
              href === current
                ? "bg-sheet font-medium text-ink shadow-[inset_2px_0_0_var(--color-petrol)]"
                : "text-ink-2 hover:bg-hair-2 hover:text-ink",
            )}
          >
            {label}
            {badge && badge.count > 0 ? <Badge {...badge} /> : null}
          </Link>
        </li>
      ))}
    </ul>
  );
}

const tones = { out: "text-out", held: "text-held", plain: "text-ink-2" };

function Badge({ count, label, tone = "out" }: NavigationBadge) {
  return (
    <span className={classNames("font-medium", tones[tone])}>
      <span aria-hidden="true">{count}</span>
      <span className="sr-only">, {label}</span>
    </span>
  );
}
