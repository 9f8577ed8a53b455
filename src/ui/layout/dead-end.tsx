import Link from "next/link";
import type { ReactNode } from "react";
import { buttonStyle } from "../button-style";
import { Mark } from "./mark";

type Props = { title: string; children?: ReactNode; action?: ReactNode };

/** A page where the way ends: what it is, in a sentence, and the way on. */
export function DeadEnd({ title, children, action }: Props) {
  return (
    <main className="mx-auto flex min-h-[70dvh] max-w-prose flex-col items-center justify-center gap-2 px-5 py-10 text-center">
      <span className="mb-1 opacity-60 grayscale">
        <Mark size={36} />
      </span>
      <h1 className="text-title tracking-tight">{title}</h1>
      <p className="text-ink-2">{children}</p>
      <div className="mt-3 flex flex-wrap justify-center gap-2">
        {action}
        <Link href="/" className={buttonStyle("plain")}>
          To the start page
        </Link>
      </div>
    </main>
  );
}
