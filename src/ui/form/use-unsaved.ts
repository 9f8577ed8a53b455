"use client";
import { useEffect, useEffectEvent, useRef } from "react";

type Options = { formId: string; saved: unknown; onLeave: (href: string) => void };

/** Watches a form for typing and a page for being left. Returns what forgets the typed text. */
export function useUnsaved({ formId, saved, onLeave }: Options): () => void {
  const typed = useRef(false);
  const asked = useEffectEvent(onLeave);

  useEffect(() => {
    if (saved) typed.current = false;
  }, [saved]);

  useEffect(() => {
    function note(event: Event) {
      if (event.target instanceof Element && event.target.closest("form")?.id === formId)
        typed.current = true;
    }
    function beforeUnload(event: BeforeUnloadEvent) {
      if (typed.current) event.preventDefault();
    }
    function follow(event: MouseEvent) {
      const href = typed.current ? leadingAway(event) : null;
      if (!href) return;
      event.preventDefault();
      event.stopPropagation();
      asked(href);
    }
    document.addEventListener("input", note);
    window.addEventListener("beforeunload", beforeUnload);
    document.addEventListener("click", follow, { capture: true });
    return () => {
      document.removeEventListener("input", note);
      window.removeEventListener("beforeunload", beforeUnload);
      document.removeEventListener("click", follow, { capture: true });
    };
  }, [formId]);

  return () => {
    typed.current = false;
  };
}

/** The address of a plain click on a link to another page of ours. */
function leadingAway(event: MouseEvent): string | null {
  if (event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return null;
  const link = event.target instanceof Element ? event.target.closest("a") : null;
  if (!link?.href || link.target === "_blank" || link.hasAttribute("download")) return null;
  const { origin, pathname, search } = new URL(link.href);
  if (origin !== location.origin) return null;
  const samePage = pathname === location.pathname && search === location.search;
  return samePage ? null : pathname + search + new URL(link.href).hash;
}
