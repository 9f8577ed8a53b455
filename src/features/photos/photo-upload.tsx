"use client";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { mostPhotoBytes } from "@/data/photos/inputs";
import type { SetDetail } from "@/data/sets";
import { FilePicker } from "@/ui/form/file-picker";
import { RadioGroup } from "@/ui/form/radio-group";
import { Select } from "@/ui/form/select";
import { sendPhoto } from "./send-photo";

type Props = {
  set: Pick<SetDetail, "setId" | "injectors">;
  /** What may be photographed: the counter takes intake photos only. */
  kinds: readonly ("intake" | "spray")[];
  /** For spray photos, which the bench takes as found and as left. */
  phase?: "as found" | "as left";
};

/** Takes photos of a set with the camera or from files; each is sent at once. */
export function PhotoUpload({ set, kinds, phase: initialPhase = "as left" }: Props) {
  const router = useRouter();
  const [kind, setKind] = useState(kinds[0] ?? "intake");
  const [phase, setPhase] = useState<string>(initialPhase);
  const [setInjectorId, setInjector] = useState("");
  const spray = kind === "spray";
  const shown = set.injectors.filter(({ state }) => state !== "replaced");
  const ready = !spray || setInjectorId !== "";
  return (
    <div className="flex flex-col gap-2.5">
      <div className="flex flex-wrap items-start gap-x-6 gap-y-2">
        {kinds.length > 1 ? (
          <RadioGroup
            label="Kind of photo"
            options={[
              { value: "intake", label: "as it came in" },
              { value: "spray", label: "spray" },
            ]}
            defaultChosen={kind}
            onChoose={(chosen) => setKind(chosen as typeof kind)}
          />
        ) : null}
        {spray ? (
          <RadioGroup
            label="Phase"
            options={["as found", "as left"]}
            defaultChosen={phase}
            onChoose={setPhase}
          />
        ) : null}
        <Select
          label="Shows"
          placeholder={spray ? "choose an injector" : "the set as a whole"}
          options={shown.map((injector) => ({
            value: injector.setInjectorId,
            label: [injector.tag, injector.serial].filter(Boolean).join(", "),
          }))}
          value={setInjectorId}
          onChange={(event) => setInjector(event.target.value)}
          className="w-56"
        />
      </div>
      {ready ? (
        <FilePicker
          key={`${kind} ${phase} ${setInjectorId}`}
          label={spray ? "Spray photos" : "Photos"}
          hint="JPEG, PNG or WebP, up to 25 MB each."
          accept="image/jpeg,image/png,image/webp"
          camera
          largestBytes={mostPhotoBytes}
          upload={sendPhoto({
            setId: set.setId,
            setInjectorId: setInjectorId || undefined,
            kind,
            phase: spray ? phase : undefined,
          })}
          onUploaded={() => router.refresh()}
        />
      ) : (
        <p className="text-ink-2">A spray photo shows one injector: choose it first.</p>
      )}
    </div>
  );
}
