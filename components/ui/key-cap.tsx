/** The key that does the same as the thing beside it. Shown on fine pointers only; hidden from readers, who get `aria-keyshortcuts`. */
export function KeyCap({ children }: { children: string }) {
  return (
    <kbd className="key" aria-hidden="true">
      {children}
    </kbd>
  );
}

/** Attributes that make the shell's key listener press this element. Enter is left to the browser. */
export function keyAttributes(keyCap: string | undefined): { "data-key"?: string; "aria-keyshortcuts"?: string } {
  if (!keyCap || keyCap === "↵") return {};
  return { "data-key": keyCap.toLowerCase(), "aria-keyshortcuts": keyCap };
}
