import "server-only";
import { formatRecordDayOf } from "../../../format/format-date";
import { type Block, beside, gap, stack } from "../../drawing/block";
import type { Pen } from "../../drawing/pen";
import { styles } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { heading, paragraph } from "../../drawing/text-blocks";
import type { CertificateContent, CertifiedPhoto } from "../content";
import { checksOf } from "../reading-content";

export type Photos = ReadonlyMap<string, Uint8Array>;

const perRow = 4;
const between = 10;

/** Spray photos in rows; a photo that was not handed over is an error, never a gap. */
export function photoSections(
  pen: Pen,
  content: CertificateContent,
  photos: Photos,
  width: number,
): Section[] {
  if (content.photos.length === 0) return [];
  const each = (width - between * (perRow - 1)) / perRow;
  const blocks = inOrder(content).map((photo) => photoBlock(pen, content, photo, photos, each));
  const rows = Array.from({ length: Math.ceil(blocks.length / perRow) }, (_, row) =>
    stack([
      beside(
        blocks
          .slice(row * perRow, (row + 1) * perRow)
          .map((block, column) => ({ at: column * (each + between), block })),
      ),
      gap(8),
    ]),
  );
  return [
    {
      lead: heading(pen, "Spray", "as photographed on the bench", width),
      repeated: heading(pen, "Spray, continued", "", width),
      rows,
    },
  ];
}

function inOrder({ photos, injectors }: CertificateContent): CertifiedPhoto[] {
  const place = ({ injectorId }: CertifiedPhoto) =>
    injectors.findIndex((injector) => injector.injectorId === injectorId);
  return photos.toSorted(
    (one, other) =>
      place(one) - place(other) ||
      one.phase.localeCompare(other.phase) ||
      (one.takenAt < other.takenAt ? -1 : 1),
  );
}

function photoBlock(
  pen: Pen,
  content: CertificateContent,
  photo: CertifiedPhoto,
  photos: Photos,
  width: number,
): Block {
  const bytes = photos.get(photo.sha256);
  const tag = content.injectors.find(({ injectorId }) => injectorId === photo.injectorId)?.tag;
  if (!bytes || !tag)
    throw new RangeError(`photos: the bytes or the injector of ${photo.sha256} are missing`);
  const height = width * 0.75;
  const grade = checksOf(
    photo.phase === "as found" ? content.asFound : content.asLeft,
    photo.injectorId,
  )?.sprayGrade;
  const caption = [photo.phase, grade ?? "no grade", formatRecordDayOf(photo.takenAt, content.lab.timeZone)];
  const words = stack([
    paragraph(pen, tag, width, styles.bodyStrong),
    paragraph(pen, caption.join(", "), width, styles.small),
  ]);
  return {
    height: height + words.height + 3,
    draw(x, y) {
      pen.doc.image(Buffer.from(bytes), x, y, { fit: [width, height], align: "center", valign: "center" });
      words.draw(x, y + height + 3);
    },
  };
}
