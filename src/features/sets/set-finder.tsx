"use client";
import { usePathname } from "next/navigation";
import { findSetInput } from "@/data/sets/inputs";
import { Form } from "@/ui/form/form";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { jumpToSetAction } from "./actions";

/** Straight to a set, by a scanned label or what somebody reads out. It is empty again where it has led. */
export function SetFinder() {
  return <Finder key={usePathname()} />;
}

function Finder() {
  const form = useServerForm({ action: jumpToSetAction, schema: findSetInput });
  return (
    <search>
      <Form form={form} className="flex flex-col">
        <TextInput
          name="typed"
          label="Find a set"
          labelHidden
          aria-required={false}
          type="search"
          placeholder="Number, tag, serial"
          autoComplete="off"
          spellCheck={false}
          enterKeyHint="go"
          maxLength={2000}
        />
      </Form>
    </search>
  );
}
