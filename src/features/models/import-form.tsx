"use client";
import { useState } from "react";
import type { ModelImportPreview } from "@/data/models";
import { importModelsInput, modelColumnNames } from "@/data/models/inputs";
import { plural } from "@/format/plural";
import { Notice } from "@/ui/feedback/notice";
import { Form } from "@/ui/form/form";
import { HiddenInput } from "@/ui/form/hidden-input";
import { SubmitButton } from "@/ui/form/submit-button";
import { useServerForm } from "@/ui/form/use-server-form";
import { DataTable } from "@/ui/layout/data-table";
import { importModelsAction, previewModelsAction } from "./actions";

type State =
  | { step: "nothing chosen" }
  | { step: "reading" }
  | { step: "failed"; message: string }
  | { step: "read"; csv: string; name: string; preview: ModelImportPreview };

/** A file of models: looked at first, line by line, then taken over whole or not at all. */
export function ModelImportForm() {
  const form = useServerForm({ action: importModelsAction, schema: importModelsInput });
  const [state, setState] = useState<State>({ step: "nothing chosen" });

  async function choose(file: File | undefined) {
    if (!file) return;
    setState({ step: "reading" });
    const csv = await file.text();
    const answer = await previewModelsAction(csv).catch(() => null);
    if (!answer) setState({ step: "failed", message: "The lab's server did not answer. Please try again." });
    else if ("message" in answer) setState({ step: "failed", message: answer.message });
    else setState({ step: "read", csv, name: file.name, preview: answer });
  }

  return (
    <Form form={form} className="flex max-w-3xl flex-col gap-3">
      <p className="text-ink-2">
        UTF-8, comma or semicolon, the first line naming the columns:{" "}
        <code className="text-small">{Object.values(modelColumnNames).join(", ")}</code>
      </p>
      <label className="flex flex-col gap-1 text-small font-medium">
        CSV file
        <input
          type="file"
          accept=".csv,text/csv"
          onChange={(event) => choose(event.target.files?.[0])}
          className="text-body font-normal"
        />
      </label>
      <div aria-live="polite">
        {state.step === "reading" ? "Reading the file" : null}
        {state.step === "failed" ? <Notice kind="refusal" title={state.message} /> : null}
      </div>
      {state.step === "read" ? <Preview {...state} /> : null}
    </Form>
  );
}

function Preview({ csv, name, preview: { lines, problems } }: Extract<State, { step: "read" }>) {
  const fresh = lines.filter(({ change }) => change === "new");
  return (
    <>
      {problems.length > 0 ? (
        <Notice
          kind="refusal"
          title={`${name}: ${plural(problems.length, "problem")}; nothing is taken over.`}
        >
          <ul className="list-disc pl-4">
            {problems.map(({ line, column, message }) => (
              <li key={`${line} ${column} ${message}`}>
                Line {line}
                {column ? `, ${column}` : ""}: {message}
              </li>
            ))}
          </ul>
        </Notice>
      ) : null}
      <DataTable
        caption="Models in the file"
        dense
        rows={lines}
        rowKey={({ line }) => String(line)}
        columns={[
          { key: "line", head: "Line", cell: ({ line }) => line },
          { key: "model", head: "Model", cell: ({ make, partNumber }) => `${make} ${partNumber}` },
          {
            key: "change",
            head: "What happens",
            cell: ({ change }) => (change === "new" ? "is added" : "is known already"),
          },
        ]}
      />
      <HiddenInput name="csv" value={csv} />
      {problems.length === 0 && fresh.length > 0 ? (
        <div className="flex justify-end">
          <SubmitButton size="large" busyLabel="Importing">
            Add {plural(fresh.length, "model")}
          </SubmitButton>
        </div>
      ) : null}
    </>
  );
}
