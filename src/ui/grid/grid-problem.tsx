import { Notice } from "../feedback/notice";
import { Button } from "../form/button";

export function GridProblem({ message, onRetry }: { message: string; onRetry: () => void }) {
  return (
    <div className="p-4">
      <Notice
        kind="error"
        live
        title="The list could not be loaded"
        action={
          <Button size="small" onClick={onRetry}>
            Try again
          </Button>
        }
      >
        <p>{message}</p>
      </Notice>
    </div>
  );
}
