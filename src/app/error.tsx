"use client";
import { Button } from "@/ui/form/button";
import { DeadEnd } from "@/ui/layout/dead-end";

type Props = { error: Error & { digest?: string }; retry: () => void };

/** The log holds the cause under the same reference. */
export default function ErrorPage({ error, retry }: Props) {
  return (
    <DeadEnd
      title="This page could not be made"
      action={
        <Button kind="primary" onClick={retry}>
          Try again
        </Button>
      }
    >
      What is recorded is safe.{" "}
      {error.digest ? <>If it happens again, tell the lab manager the reference {error.digest}.</> : null}
    </DeadEnd>
  );
}
