import { CircleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { classNames } from "../class-names";

type Props = { id: string; errors?: string[]; hint?: ReactNode };

/** The height is reserved: an error that comes or goes must not move the button somebody is about to press. */
export function FieldMessage({ id, errors, hint }: Props) {
  return (
    <p id={id} className={classNames("mt-0.5 min-h-[1.0625rem] text-small", hint ? "mb-1.5" : null)}>
      {errors ? (
        <span className="flex gap-1 text-out">
          <CircleAlert aria-hidden="true" size={13} className="mt-0.5 shrink-0" />
          {errors.join(" ")}
        </span>
      ) : (
        <span className="text-ink-2">{hint}</span>
      )}
    </p>
  );
}
