"use client";
import Link from "next/link";
import { usePathname } from "next/navigation";
import type { ReactNode } from "react";
import { classNames } from "../class-names";

export type Tab = { href: string; label: ReactNode; count?: number; current?: boolean };

/** Pages of one subject, as links. A tab is current by its address unless it says so itself. */
export function Tabs({ tabs, label }: { tabs: readonly Tab[]; label: string }) {
  const path = usePathname();
  return (
    <nav
      aria-label={label}
      className="mb-3.5 overflow-x-auto border-b border-hair thin-scrollbar print:hidden"
    >
      <ul className="flex gap-5">
        {tabs.map(({ href, label: name, count, current = path === href }) => (
          <li key={href}>
            <Link
              href={href}
              aria-current={current ? "page" : undefined}
              className={classNames(
                "touch-target -mb-px inline-flex items-center gap-1.5 border-b-[3px] px-0.5 py-2 whitespace-nowrap no-underline -outline-offset-2",
                current
                  ? "border-petrol font-medium text-ink"
                  : "border-transparent text-ink-2 hover:border-edge hover:text-ink",
              )}
            >
              {name}
              {count === undefined ? null : <span className="text-small text-ink-2">{count}</span>}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
