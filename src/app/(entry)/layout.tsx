import type { ReactNode } from "react";
import { Wordmark } from "@/ui/layout/mark";

/** One sheet in the middle: what stands before the lab's door. */
export default function EntryLayout({ children }: { children: ReactNode }) {
  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-[26rem] flex-col justify-center px-4 py-10">
      <div className="mb-6">
        <Wordmark />
      </div>
      {children}
    </main>
  );
}
