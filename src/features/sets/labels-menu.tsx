"use client";
import { ChevronDown, Printer } from "lucide-react";
import { DropdownMenu } from "radix-ui";
import { buttonStyle } from "@/ui/button-style";
import { labelSizes } from "./label-sizes";

/** Bag labels of a set in the sizes that labels come in. Each opens as a PDF beside this page. */
export function LabelsMenu({ setId, kind = "plain" }: { setId: string; kind?: "plain" | "primary" }) {
  return (
    <DropdownMenu.Root>
      <DropdownMenu.Trigger className={buttonStyle(kind)}>
        <Printer aria-hidden="true" size={15} />
        Labels
        <ChevronDown aria-hidden="true" size={14} />
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="end"
          sideOffset={4}
          className="z-40 min-w-56 rounded-control border border-hair bg-raised py-1 shadow-float"
        >
          {labelSizes.map(({ size, label }) => (
            <DropdownMenu.Item key={size} asChild>
              <a
                href={`/api/files/labels/${setId}?size=${size}`}
                target="_blank"
                rel="noreferrer"
                className="touch-target flex items-center px-3 py-1.5 no-underline data-highlighted:bg-petrol-soft"
              >
                {label}
              </a>
            </DropdownMenu.Item>
          ))}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
