import { Check, CircleAlert, RotateCcw, X } from "lucide-react";
import { formatBytes } from "../../format/format-bytes";
import { buttonStyle } from "../button-style";
import { Progress } from "../feedback/progress";
import type { UploadItem } from "./upload-item";

type Props = {
  items: readonly UploadItem[];
  onRetry: (key: string) => void;
  onRemove: (item: UploadItem) => void;
  /** Whether one that has arrived can be taken back. */
  removable: boolean;
};

export function FileList({ items, onRetry, onRemove, removable }: Props) {
  if (items.length === 0) return null;
  return (
    <ul className="flex flex-col divide-y divide-hair-2 border-y border-hair-2">
      {items.map((item) => (
        <li key={item.key} className="flex items-center gap-3 py-2">
          <Preview url={item.uploaded?.previewUrl ?? item.previewUrl} />
          <div className="min-w-0 flex-1">
            <p className="truncate">{item.name}</p>
            <State item={item} />
          </div>
          {item.state === "failed" ? (
            <button type="button" className={buttonStyle("plain", "small")} onClick={() => onRetry(item.key)}>
              <RotateCcw aria-hidden="true" size={14} />
              Try again<span className="sr-only"> to send {item.name}</span>
            </button>
          ) : null}
          {item.state !== "done" || removable ? (
            <button type="button" className={buttonStyle("quiet", "small")} onClick={() => onRemove(item)}>
              <X aria-hidden="true" size={14} />
              <span className="sr-only">Remove {item.name}</span>
            </button>
          ) : null}
        </li>
      ))}
    </ul>
  );
}

function Preview({ url }: { url: string | null }) {
  if (!url) return <span className="size-11 shrink-0 rounded-mark bg-hair-2" />;
  // biome-ignore lint/performance/noImgElement: a picture of this browser's own, or a thumbnail made by the server
  return <img src={url} alt="" className="size-11 shrink-0 rounded-mark object-cover" />;
}

function State({ item }: { item: UploadItem }) {
  if (item.state === "uploading")
    return <Progress label={`Sending ${item.name}`} labelHidden value={item.progress} />;
  if (item.problem)
    return (
      <p role="alert" className="flex items-center gap-1 text-small text-out">
        <CircleAlert aria-hidden="true" size={13} />
        {item.problem}
      </p>
    );
  return (
    <p className="flex items-center gap-1 text-small text-ink-2">
      {item.state === "done" ? <Check aria-hidden="true" size={13} /> : null}
      {item.state === "done" ? "saved" : "waiting"}, {formatBytes(item.size)}
    </p>
  );
}
