const MARGIN = 12;
const TITLE = 28;

/** The picture with its title on paper, to the clipboard; as a file where the host keeps images from it. */
export async function copyImage(canvas: HTMLCanvasElement, title: string): Promise<"copied" | "saved"> {
  const blob = await withTitle(canvas, title);
  try {
    await navigator.clipboard.write([new ClipboardItem({ "image/png": blob })]);
    return "copied";
  } catch {
    const link = document.createElement("a");
    link.href = URL.createObjectURL(blob);
    link.download = "beadline-picture.png";
    link.click();
    URL.revokeObjectURL(link.href);
    return "saved";
  }
}

function withTitle(canvas: HTMLCanvasElement, title: string): Promise<Blob> {
  const scale = devicePixelRatio;
  const image = document.createElement("canvas");
  image.width = canvas.width + 2 * MARGIN * scale;
  image.height = canvas.height + (2 * MARGIN + TITLE) * scale;
  const context = image.getContext("2d")!;
  const { backgroundColor } = getComputedStyle(canvas.closest(".pane")!);
  const { color, fontFamily } = getComputedStyle(canvas);
  context.fillStyle = backgroundColor;
  context.fillRect(0, 0, image.width, image.height);
  context.fillStyle = color;
  context.font = `600 ${14 * scale}px ${fontFamily}`;
  context.textBaseline = "top";
  context.fillText(title, MARGIN * scale, MARGIN * scale, canvas.width);
  context.drawImage(canvas, MARGIN * scale, (MARGIN + TITLE) * scale);
  return new Promise((resolve, reject) =>
    image.toBlob((blob) => (blob ? resolve(blob) : reject(new Error("no image"))), "image/png"),
  );
}
