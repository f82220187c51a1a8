import { Button } from '../../../components/ui/button.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { VerdictMark } from '../../../components/ui/verdict-mark.tsx';
import { useVerification } from '../api/verify-audit.ts';

/** Whether the chain of hashes holds, walked anew by the server. */
export function Verification() {
  const verification = useVerification();
  return (
    <Loaded query={verification} what="the state of the chain">
      {(result) => (
        <div className="mb-6 flex flex-wrap items-center gap-x-6 gap-y-2 border-y border-rule py-2">
          <span role="status">
            {result.holds ? (
              <VerdictMark verdict="holds" word={`The chain of ${String(result.events)} events holds`} />
            ) : (
              <VerdictMark
                verdict="fails"
                word={`The chain is broken at event ${String(result.firstBroken ?? '?')}: the record has been changed`}
              />
            )}
          </span>
          <span className="figures min-w-0 truncate text-[13px] text-ink-soft" title={result.lastHash}>
            last hash {result.lastHash.slice(0, 16)}…
          </span>
          <Button
            small
            busy={verification.isFetching}
            className="ml-auto"
            onClick={() => void verification.refetch()}
          >
            Verify again
          </Button>
        </div>
      )}
    </Loaded>
  );
}
