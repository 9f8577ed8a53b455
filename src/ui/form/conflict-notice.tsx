"use client";
import { buttonStyle } from "../button-style";
import { Notice } from "../feedback/notice";
import type { ServerForm } from "./use-server-form";

// biome-ignore lint/suspicious/noExplicitAny: any form will do here, whatever its schema
type Props = { form: ServerForm<any> };

/** Somebody else saved first: both values of each field, and a way on. What was typed stays typed. */
export function ConflictNotice({ form: { form, reply } }: Props) {
  const conflict = reply?.conflict;
  if (!conflict) return null;
  const newer = conflict.find(({ field }) => field === "version");
  const differing = conflict.filter(({ field }) => field !== "version");

  function put(name: string, value: string) {
    form.update({ name, value } as never);
  }

  return (
    <Notice kind="caution" title="Both values, for you to choose">
      <table className="mt-1 w-full border-collapse">
        <thead>
          <tr className="text-left text-key text-ink-2">
            <th className="py-1 pr-3 font-normal">Field</th>
            <th className="py-1 pr-3 font-normal">Saved meanwhile</th>
            <th className="py-1 pr-3 font-normal">Yours</th>
            <th className="py-1">
              <span className="sr-only">Choice</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {differing.map(({ field, label, theirs, yours }) => (
            <tr key={field} className="border-t border-hair-2 align-top">
              <th scope="row" className="py-1.5 pr-3 text-left font-normal text-ink-2">
                {label}
              </th>
              <td className="py-1.5 pr-3 font-medium wrap-break-word">{theirs || "empty"}</td>
              <td className="py-1.5 pr-3 font-medium wrap-break-word">{yours || "empty"}</td>
              <td className="py-1.5 text-right">
                <button
                  type="button"
                  className={buttonStyle("plain", "small")}
                  onClick={() => put(field, theirs)}
                >
                  Take the saved one<span className="sr-only"> for {label}</span>
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {newer ? (
        <button
          type="button"
          className={`${buttonStyle("plain", "small")} mt-2`}
          onClick={() => put("version", newer.theirs)}
        >
          Go on with what the form holds now
        </button>
      ) : (
        <p className="mt-1">Reload the page to start from what is saved now.</p>
      )}
    </Notice>
  );
}
