"use client";
import { Menu, X } from "lucide-react";
import { Dialog } from "radix-ui";
import { type ReactNode, useState } from "react";
import { Wordmark } from "./mark";
import type { NavigationItem } from "./navigation";
import { NavigationLinks } from "./navigation-links";

type Props = { items: readonly NavigationItem[]; head?: ReactNode; foot: ReactNode };

/** The navigation on a phone: opened from the top bar, closed by choosing, Escape or a tap beside it. */
export function NavigationDrawer({ items, head, foot }: Props) {
  const [open, setOpen] = useState(false);
  const attention = items.some(({ badge }) => badge && badge.count > 0);
  return (
    <Dialog.Root open={open} onOpenChange={setOpen}>
      <Dialog.Trigger className="relative -mr-2 inline-flex size-11 items-center justify-center rounded-control text-ink">
        <Menu aria-hidden="true" size={22} />
        <span className="sr-only">{attention ? "Menu, something needs attention" : "Menu"}</span>
        {attention ? <span className="absolute top-2.5 right-2 size-2 rounded-mark bg-out" /> : null}
      </Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-veil" />
        <Dialog.Content
          aria-describedby={undefined}
          className="fixed inset-y-0 right-0 z-50 flex w-[min(20rem,86vw)] flex-col overflow-y-auto border-l border-hair bg-ground p-4"
        >
          <div className="mb-4 flex items-center justify-between pl-2">
            <Dialog.Title>
              <Wordmark />
            </Dialog.Title>
            <Dialog.Close className="-mr-2 inline-flex size-11 items-center justify-center rounded-control">
              <X aria-hidden="true" size={22} />
              <span className="sr-only">Close the menu</span>
            </Dialog.Close>
          </div>
          {head}
          <nav aria-label="Main">
            <NavigationLinks items={items} onNavigate={() => setOpen(false)} large />
          </nav>
          <div className="mt-auto pt-6">{foot}</div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
