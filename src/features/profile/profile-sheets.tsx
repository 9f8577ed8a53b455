import type { getOwnProfile } from "@/data/people";
import type { Clock } from "@/format/calendar";
import { formatInstant } from "@/format/format-date";
import { joinWords } from "@/format/join-words";
import { ActionButton } from "@/ui/form/action-button";
import { Facts } from "@/ui/layout/facts";
import { Sheet } from "@/ui/layout/sheet";
import { endOwnSignInAction } from "./actions";
import { describeBrowser } from "./describe-browser";
import { PasswordForm } from "./password-form";

type Profile = Awaited<ReturnType<typeof getOwnProfile>>;

/** Who one is here, the password, and where one is signed in. */
export function ProfileSheets({ profile, clock }: { profile: Profile; clock: Clock }) {
  const { email, roles, actsFor, signIns } = profile;
  return (
    <div className="flex flex-col gap-3.5">
      <Sheet title="Account">
        <Facts
          align="left"
          facts={[
            { label: "E-mail", value: email },
            ...(roles.length > 0 ? [{ label: "Roles", value: joinWords(roles) }] : []),
            ...(actsFor.length > 0 ? [{ label: "Acts for", value: joinWords(actsFor) }] : []),
          ]}
        />
      </Sheet>
      <Sheet title="Password">
        <PasswordForm />
      </Sheet>
      <Sheet title="Signed in at">
        <ul className="divide-y divide-hair-2">
          {signIns.map(({ signInId, browser, since, isThisOne }) => (
            <li key={signInId} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 py-2">
              <span className="min-w-0 flex-1 basis-64">
                {isThisOne ? <strong className="font-semibold">This browser. </strong> : null}
                <span className="text-small text-ink-2 wrap-break-word">{describeBrowser(browser)}</span>
                <span className="block text-small">since {formatInstant(since, clock)}</span>
              </span>
              {isThisOne ? null : (
                <ActionButton
                  action={endOwnSignInAction}
                  fields={{ signInId }}
                  size="small"
                  busyLabel="Ending"
                >
                  End it
                </ActionButton>
              )}
            </li>
          ))}
        </ul>
      </Sheet>
    </div>
  );
}
