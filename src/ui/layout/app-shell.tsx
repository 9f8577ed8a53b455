import Link from "next/link";
import type { ReactNode } from "react";
import { Wordmark } from "./mark";
import type { NavigationItem } from "./navigation";
import { NavigationDrawer } from "./navigation-drawer";
import { NavigationLinks } from "./navigation-links";
import { SkipLink } from "./skip-link";

type Props = {
  navigation: readonly NavigationItem[];
  /** Who is signed in. */
  person: { name: string; role: string; href?: string };
  /** Stands above the navigation, such as a field that finds what is worked on. */
  finder?: ReactNode;
  /** The button that signs out. */
  signOut?: ReactNode;
  /** Where the mark leads. */
  homeHref?: string;
  /** For pages that use the whole width, such as the bench. */
  wide?: boolean;
  children: ReactNode;
};

/** The frame of every signed-in page: navigation at the side, on a phone behind a menu button in a top bar. */
export function AppShell({ navigation, person, finder, signOut, homeHref = "/", wide, children }: Props) {
  const foot = <SignedIn person={person} signOut={signOut} />;
  return (
    <div className="laptop:grid laptop:min-h-dvh laptop:grid-cols-[184px_minmax(0,1fr)]">
      <SkipLink />
      <header className="sticky top-0 z-30 flex items-center justify-between border-b border-hair bg-ground px-4 py-1.5 laptop:hidden print:hidden">
        <Link href={homeHref} className="rounded-control py-1.5 no-underline">
          <Wordmark />
        </Link>
        <NavigationDrawer items={navigation} head={finder} foot={foot} />
      </header>
      <div className="hidden border-r border-hair laptop:block print:hidden">
        <div className="sticky top-0 flex h-dvh flex-col overflow-y-auto px-3.5 pt-5 pb-3 thin-scrollbar">
          <Link href={homeHref} className="mx-1 mb-4 self-start rounded-control px-1 py-0.5 no-underline">
            <Wordmark />
          </Link>
          {finder}
          <nav aria-label="Main">
            <NavigationLinks items={navigation} />
          </nav>
          <div className="mt-auto pt-6">{foot}</div>
        </div>
      </div>
      <main
        id="main"
        tabIndex={-1}
        className={`min-w-0 px-4 pt-4 pb-12 outline-none tablet:px-7 tablet:pt-5 ${wide ? "" : "max-w-[1256px]"}`}
      >
        {children}
      </main>
    </div>
  );
}

function SignedIn({ person, signOut }: Pick<Props, "person" | "signOut">) {
  return (
    <div className="flex flex-col gap-2 border-t border-hair px-2.5 pt-2.5 text-small text-ink-2">
      <p>
        {person.href ? (
          <Link href={person.href} className="text-ink hover:underline">
            {person.name}
          </Link>
        ) : (
          person.name
        )}
        <br />
        {person.role}
      </p>
      {signOut}
    </div>
  );
}
