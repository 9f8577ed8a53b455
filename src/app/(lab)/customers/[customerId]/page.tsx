import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { getCustomer } from "@/data/customers";
import { answerPage } from "@/data/edge/answer-page";
import { SetList } from "@/features/sets/set-list";
import { formatDayOf } from "@/format/format-date";
import { ButtonLink } from "@/ui/layout/button-link";
import { Facts } from "@/ui/layout/facts";
import { PageHeader } from "@/ui/layout/page-header";
import { Section } from "@/ui/layout/section";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../../lab-clock";

type Props = PageProps<"/customers/[customerId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: (await answerPage(getCustomer(await currentContext(), await params))).name };
}

export default async function CustomerPage({ params }: Props) {
  const { customerId } = await params;
  const context = await currentContext();
  const { name, contact, internalNote, since, people } = await answerPage(
    getCustomer(context, { customerId }),
  );
  const clock = await labClock(context);
  const facts = [
    { label: "Contact", value: contact?.contactName },
    { label: "E-mail", value: contact?.email },
    { label: "Phone", value: contact?.phone },
    { label: "Address", value: <span className="whitespace-pre-line">{contact?.address}</span> },
    { label: "Internal note", value: <span className="whitespace-pre-line">{internalNote}</span> },
    {
      label: "Sign in for it",
      value:
        people.map((person) => (person.active ? person.name : `${person.name} (disabled)`)).join(", ") ||
        "nobody",
    },
  ];
  const roles = rolesOf(context.actor);
  return (
    <>
      <PageHeader
        title={name}
        subtitle={`since ${formatDayOf(since, clock)}`}
        back={<Link href="/customers">Customers</Link>}
        actions={
          roles.includes("counter") || roles.includes("manager") ? (
            <>
              <ButtonLink href={`/customers/${customerId}/edit`}>Edit</ButtonLink>
              <ButtonLink kind="primary" href={`/sets/new?customer=${customerId}`}>
                Check in a set
              </ButtonLink>
            </>
          ) : null
        }
      />
      {contact ? (
        <Sheet>
          <Facts align="left" facts={facts.map((fact) => ({ ...fact, value: fact.value || "–" }))} />
        </Sheet>
      ) : null}
      <Section title="Sets">
        <SetList view="all" clock={clock} customerId={customerId} />
      </Section>
    </>
  );
}
