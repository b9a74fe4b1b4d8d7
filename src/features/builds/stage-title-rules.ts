const most = 80;

/** The rules of a stage's name, as the contract has them; `root` messages of the server come on top. */
export const stageTitleRules = {
  setValueAs: (text: string | undefined) => text?.trim() ?? "",
  required: "The stage's name is missing.",
  maxLength: { value: most, message: `The stage's name may be at most ${most} characters.` },
};
