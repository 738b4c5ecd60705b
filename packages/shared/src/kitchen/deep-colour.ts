/** One sRGB channel as light, 0 to 1 (IEC 61966-2-1). */
function linear(channel: number): number {
  return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
}

/** Dark below this luminance whatever the hue; strong hues count as deep well above it. */
const darkLuminance = 0.12;
const strongLuminance = 0.4;
const strongSpread = 0.65;

/**
 * Whether a colour takes so much dye that it stains and may bleed: dark, or strong without being
 * light. The limits are memory.
 */
export function isDeepColour(hex: string): boolean {
  const value = Number.parseInt(hex.slice(1), 16);
  const channels = [(value >> 16) & 255, (value >> 8) & 255, value & 255].map((it) => it / 255);
  const [red = 0, green = 0, blue = 0] = channels.map(linear);
  const luminance = 0.2126 * red + 0.7152 * green + 0.0722 * blue;
  const spread = Math.max(...channels) - Math.min(...channels);
  return luminance < darkLuminance || (spread > strongSpread && luminance < strongLuminance);
}
