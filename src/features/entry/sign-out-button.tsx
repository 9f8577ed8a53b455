import { buttonStyle } from "@/ui/button-style";
import { signOutAction } from "./actions";

/** A plain form, so that it works without a script too. */
export function SignOutButton() {
  return (
    <form action={signOutAction}>
      <button type="submit" className={`${buttonStyle("quiet", "small")} -ml-2.5`}>
        Sign out
      </button>
    </form>
  );
}
