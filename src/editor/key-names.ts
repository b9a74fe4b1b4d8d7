const words: Record<string, string> = {
  Alt: "Alt",
  Shift: "Shift",
  ArrowUp: "↑",
  ArrowDown: "↓",
  Escape: "Esc",
};

/** A shortcut in the words on the keys: "Mod-Alt-2" is "Ctrl Alt 2", or "Cmd Option 2" on a Mac. */
export function keyNames(keys: string, mac: boolean): string[] {
  return keys.split("-").map((key) => {
    if (key === "Mod") return mac ? "Cmd" : "Ctrl";
    if (key === "Alt" && mac) return "Option";
    return words[key] ?? (key.length === 1 ? key.toUpperCase() : key);
  });
}

/** The form that `aria-keyshortcuts` wants. */
export function ariaKeys(keys: string, mac: boolean): string {
  return keys.replace("Mod", mac ? "Meta" : "Control").replaceAll("-", "+");
}

/** Whether the keyboard in front of us says Cmd. Only called in the browser. */
export function isMac(): boolean {
  return /Mac|iPhone|iPad/.test(navigator.platform);
}
