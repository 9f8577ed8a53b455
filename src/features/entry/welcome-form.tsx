"use client";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { welcomeAction } from "./actions";
import { welcomeInput } from "./inputs";

/** Opening the page does not spend the link; sending this form does. */
export function WelcomeForm({ token }: { token: string }) {
  const form = useServerForm({ action: welcomeAction, schema: welcomeInput });
  return (
    <Form form={form}>
      <HiddenInput name="token" value={token} />
      <TextInput
        name="password"
        label="Choose a password"
        type="password"
        autoComplete="new-password"
        hint="15 characters or more; a few unrelated words are easy to keep."
        autoFocus
      />
      <SubmitButton size="large" busyLabel="Setting up" className="mt-1">
        Set the password and sign in
      </SubmitButton>
    </Form>
  );
}
