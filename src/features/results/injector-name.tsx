import type { CertifiedInjector } from "@/data/certificates";

type Props = { injector: Pick<CertifiedInjector, "position" | "tag" | "serial" | "marking" | "state"> };

/** How an injector is named wherever its figures stand: place, then serial or marking. */
export function InjectorName({ injector }: Props) {
  const { position, tag, serial, marking, state } = injector;
  const letter = /[A-Z]$/.exec(tag)?.[0] ?? "";
  return (
    <span className="inline-flex items-baseline gap-1.5">
      <span>
        {position}
        {letter}
      </span>
      <span className="text-small font-normal text-ink-2">{serial ?? (marking || tag)}</span>
      {state === "in set" ? null : <span className="text-key font-normal text-out">{state}</span>}
    </span>
  );
}
