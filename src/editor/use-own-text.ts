import { useState } from "react";

/**
 * The text of a field inside a block. The field owns it while typing, since the block's own value comes back a moment
 * later and would move the caret; a change from elsewhere, such as undo, is taken over.
 */
export function useOwnText(value: string, onChange: (text: string) => void) {
  const [own, setOwn] = useState({ text: value, handedOn: value });
  if (own.handedOn !== value && own.text !== value) setOwn({ text: value, handedOn: value });
  const change = (text: string) => {
    setOwn({ text, handedOn: value });
    onChange(text);
  };
  return [own.text, change] as const;
}
