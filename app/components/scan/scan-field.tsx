import { useEffect, useRef } from "react";
import { Form, useNavigation } from "react-router";
import { Button } from "../../ui/button";

/** The field for a tag's code: typed by hand, or by a scanner that ends with Enter. Leads to the vehicle. */
export function ScanField({
  typed = "",
  problem = null,
  focus = false,
}: {
  typed?: string;
  /** What is wrong with it, in words. */
  problem?: string | null;
  /** Has the cursor when the page opens. */
  focus?: boolean;
}) {
  const input = useRef<HTMLInputElement>(null);
  const going = useNavigation().formAction?.startsWith("/scan") ?? false;
  useEffect(() => {
    if (!input.current || !focus) return;
    input.current.focus({ preventScroll: true });
    // The next scan takes the place of the one that was no good.
    if (typed) input.current.select();
  }, [focus, typed]);
  return (
    <Form action="/scan" method="get" role="search" aria-label="Find a tag" className="grid gap-2">
      <label htmlFor="scan-code" className="label">
        Code on the tag
      </label>
      <div className="flex gap-2">
        <input
          key={typed}
          ref={input}
          id="scan-code"
          name="code"
          defaultValue={typed}
          autoComplete="off"
          autoCapitalize="characters"
          autoCorrect="off"
          spellCheck={false}
          enterKeyHint="go"
          maxLength={300}
          aria-invalid={problem !== null || undefined}
          aria-describedby="scan-help"
          className="h-16 w-full min-w-0 max-w-72 rounded-[3px] border-2 border-paint-edge bg-chalk px-4 font-label font-semibold text-3xl text-ink uppercase tracking-[.18em] aria-invalid:border-oxide"
        />
        <Button tone="go" size="l" type="submit" busy={going}>
          Open
        </Button>
      </div>
      <p
        id="scan-help"
        role="status"
        className={problem ? "font-medium text-lg text-oxide" : "text-concrete-700"}
      >
        {problem ?? "Four signs under the picture. A scanner that types goes straight on."}
      </p>
    </Form>
  );
}
