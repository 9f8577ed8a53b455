"use client";
import "./globals.css";
import { Button } from "@/ui/form/button";
import { DeadEnd } from "@/ui/layout/dead-end";

type Props = { error: Error & { digest?: string }; retry: () => void };

export default function GlobalError({ error, retry }: Props) {
  return (
    <html lang="en">
      <body>
        <title>Evenrail</title>
        <DeadEnd
          title="Evenrail could not be shown"
          action={
            <Button kind="primary" onClick={retry}>
              Try again
            </Button>
          }
        >
          What is recorded is safe. {error.digest ? `Reference ${error.digest}.` : null}
        </DeadEnd>
      </body>
    </html>
  );
}
