/** Bytes of a file as the server takes them. */
export const base64 = async (file: File): Promise<string> => {
  const bytes = new Uint8Array(await file.arrayBuffer())
  let text = ''
  const piece = 32_768
  for (let at = 0; at < bytes.length; at += piece) text += String.fromCharCode(...bytes.subarray(at, at + piece))
  return btoa(text)
}
