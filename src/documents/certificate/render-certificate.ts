import "server-only";
import type { Block } from "../drawing/block";
import { beside, nothing } from "../drawing/block";
import { bytesOf, openDocument, paperSizes } from "../drawing/open-document";
import { drawRunning, type Running, runningHeadHeight } from "../drawing/page-frame";
import { makePen, type Pen } from "../drawing/pen";
import { openSheet, type Section, type Sheet } from "../drawing/sheet";
import { certificateTitle } from "./certificate-title";
import type { CertificateContent } from "./content";
import { beforeAndAfter } from "./parts/before-after";
import { calibrationsTable } from "./parts/calibrations-table";
import { checksTable } from "./parts/checks-table";
import { signatureSections, statementSections, verificationSection } from "./parts/closing";
import { conditionsTable } from "./parts/conditions-table";
import { flowLinePicture } from "./parts/flow-line-picture";
import { flowTable } from "./parts/flow-table";
import { fuelErrorPicture } from "./parts/fuel-error-picture";
import { headOf, replacementNotice } from "./parts/head";
import { itemsTable } from "./parts/items-table";
import { lineTable } from "./parts/line-table";
import { overviewOf } from "./parts/overview";
import { type Photos, photoSections } from "./parts/photo-sections";
import { verdictSections } from "./parts/verdict-table";
import { cleaningTable, methodSections } from "./parts/work-sections";
import { requirePrintable } from "./require-printable";

const margin = 40;
const top = 36;
const footRoom = 40;

/** A matched-set certificate as PDF: the same content and photos give the same bytes. */
export function renderCertificate(content: CertificateContent, photos: Photos): Promise<Uint8Array> {
  requirePrintable(content);
  const { certificate, lab, set } = content;
  const title = `${certificateTitle(content)} ${certificate.number}`;
  const doc = openDocument({
    title,
    author: lab.name,
    subject: `Set ${set.number}`,
    madeAt: certificate.issuedAt,
    program: certificate.programVersion,
  });
  const pen = makePen(doc);
  const page = paperSizes[content.paperSize];
  const running: Running = {
    page,
    margin,
    head: { left: lab.name, right: title },
    foot: `${certificate.number}, set ${set.number}, verification code ${certificate.verificationCode}`,
  };
  const below = top + runningHeadHeight(pen, running);
  const bottom = page.height - footRoom;
  const sheet = openSheet(pen, {
    page,
    left: margin,
    width: page.width - 2 * margin,
    topOf: (index) => (index === 0 ? top : below),
    bottom: bottom - 8,
  });
  placeAll(pen, sheet, content, photos);
  drawRunning(pen, running, top, bottom);
  return bytesOf(doc);
}

function placeAll(pen: Pen, sheet: Sheet, content: CertificateContent, photos: Photos): void {
  const { width } = sheet;
  const whole = (...blocks: Block[]): Section => ({ lead: nothing, rows: blocks });
  const place = (sections: Section[], before = 14) => {
    for (const section of sections) sheet.place(section, before);
  };
  place([whole(headOf(pen, content, width))]);
  place(
    replacementNotice(pen, content, width).map((block) => whole(block)),
    6,
  );
  place([whole(overviewOf(pen, content, width))], 6);
  place([whole(beforeAndAfter(pen, content, width))]);
  place(flowTable(pen, content, width));
  place([whole(picturesOf(pen, content, width))]);
  place(lineTable(pen, content, width));
  place(checksTable(pen, content, width));
  place(verdictSections(pen, content, width));
  place(itemsTable(pen, content, width));
  place(conditionsTable(pen, content, width));
  place(calibrationsTable(pen, content, width));
  place(cleaningTable(pen, content, width));
  place(photoSections(pen, content, photos, width));
  place(methodSections(pen, content, width), 10);
  place(statementSections(pen, content, width), 10);
  place(signatureSections(pen, content, width));
  place([verificationSection(pen, content, width)]);
}

function picturesOf(pen: Pen, content: CertificateContent, width: number): Block {
  const half = (width - 20) / 2;
  return beside([
    { at: 0, block: flowLinePicture(pen, content, half) },
    { at: half + 20, block: fuelErrorPicture(pen, content, half) },
  ]);
}
