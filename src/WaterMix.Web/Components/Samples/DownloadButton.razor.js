// Saves bytes from the server as a file; the address of the blob is given back at once.
export async function save(fileName, mediaType, stream) {
    const address = URL.createObjectURL(new Blob([await stream.arrayBuffer()], { type: mediaType }));
    const link = document.createElement("a");
    link.href = address;
    link.download = fileName;
    link.click();
    setTimeout(() => URL.revokeObjectURL(address), 1000);
}
