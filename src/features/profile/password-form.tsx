"use client";
import { changeOwnPasswordInput } from "@/data/people/inputs";
import { Form } from "@/ui/form/form";
import { SubmitButton } from "@/ui/form/submit-button";
import { TextInput } from "@/ui/form/text-input";
import { useServerForm } from "@/ui/form/use-server-form";
import { changeOwnPasswordAction } from "./actions";

export function PasswordForm() {
  const form = useServerForm({
    action: changeOwnPasswordAction,
    schema: changeOwnPasswordInput,
    resetWhenDone: true,
  });
  return (
    <Form form={form} className="flex max-w-md flex-col gap-2.5">
      <TextInput name="oldPassword" label="Password now" type="password" autoComplete="current-password" />
      <TextInput
        name="newPassword"
        label="New password"
        type="password"
        autoComplete="new-password"
        hint="15 characters or more; a few unrelated words are easy to keep."
      />
      <div className="flex justify-end">
        <SubmitButton busyLabel="Changing">Change the password</SubmitButton>
      </div>
    </Form>
  );
}
