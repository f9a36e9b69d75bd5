/** Where a file lay in the folder that was chosen or dropped; the browser and the drop area each note it their way. */
export function pathOf(file: File): string {
  const { webkitRelativePath, relativePath, path } = file as File & { relativePath?: string; path?: string };
  const noted = [webkitRelativePath, relativePath, path].find((text) => text) ?? file.name;
  return noted.replace(/^(\.?\/)+/, '');
}
