/** Hands a text to the person as a file. */
export function saveText(name: string, type: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // the browser has taken the text over once the click is through
  setTimeout(() => URL.revokeObjectURL(address));
}
