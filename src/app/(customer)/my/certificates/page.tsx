import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { type CertificateRow, listCertificates } from "@/data/certificates";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { CertificateStateMark } from "@/features/certificates/certificate-state";
import { formatRecordDayOf } from "@/format/format-date";
import { EmptyState } from "@/ui/layout/empty-state";
import { pagerOf, readListPage } from "@/ui/layout/list-page";
import { PageHeader } from "@/ui/layout/page-header";
import { Pager } from "@/ui/layout/pager";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "My certificates" };

/** A customer's own certificates, newest first. No grid: this page is read on phones. */
export default async function MyCertificatesPage({ searchParams }: PageProps<"/my/certificates">) {
  const page = readListPage({ page: (await searchParams).page });
  const context = await currentContext();
  const { rows, total } = await answerPage(listCertificates(context, page));
  const { clock } = await answerPage(getLabCard(context));
  return (
    <>
      <PageHeader title="My certificates" />
      <Sheet padding="none">
        {rows.length === 0 ? (
          <EmptyState title="No certificates yet">They appear when the lab releases a set.</EmptyState>
        ) : (
          <ul className="divide-y divide-hair-2">
            {rows.map((row) => (
              <li key={row.certificateId}>
                <CertificateLine row={row} zone={clock.zone} />
              </li>
            ))}
          </ul>
        )}
        {total > rows.length ? (
          <Pager {...pagerOf({ path: "/my/certificates", page, shown: rows.length, total })} />
        ) : null}
      </Sheet>
    </>
  );
}

function CertificateLine({ row, zone }: { row: CertificateRow; zone: string }) {
  const { certificateId, number, state, setNumber, model, issuedAt } = row;
  return (
    <Link
      href={`/my/certificates/${certificateId}`}
      className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 px-4 py-3.5 no-underline hover:bg-raised"
    >
      <span className="min-w-0">
        <span className="font-semibold">{number}</span> issued {formatRecordDayOf(issuedAt, zone)}
        <span className="block text-small text-ink-2">
          set {setNumber}, {model}
        </span>
      </span>
      <CertificateStateMark state={state} />
    </Link>
  );
}
