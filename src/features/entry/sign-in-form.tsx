"use client";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { signInAction } from "./actions";
import { signInInput } from "./inputs";

export function SignInForm({ next }: { next: string }) {
  const form = useServerForm({ action: signInAction, schema: signInInput });
  return (
    <Form form={form}>
      <HiddenInput name="next" value={next} />
      <TextInput
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        maxLength={254}
        autoFocus
      />
      <TextInput name="password" label="Password" type="password" autoComplete="current-password" />
      <SubmitButton size="large" busyLabel="Signing in" className="mt-1">
        Sign in
      </SubmitButton>
    </Form>
  );
}
