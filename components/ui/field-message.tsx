type FieldMessageProps = { id: string; error: string | undefined };

/** The live region stands before it is needed: a message that arrives with its region is not always read out. */
export function FieldMessage({ id, error }: FieldMessageProps) {
  return (
    <div aria-live="polite">
      {error ? (
        <p id={id} className="border-l-4 border-flag pl-2 text-15 font-bold text-flag-text">
          {error}
        </p>
      ) : null}
    </div>
  );
}
