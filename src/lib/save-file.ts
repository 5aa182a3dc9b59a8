/** Saves bytes under a name, as the browser saves a download, and gives the address to open them again. */
export function saveFile(blob: Blob, name: string): string {
  const address = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  document.body.append(link);
  link.click();
  link.remove();
  return address;
}
