/** Addresses of networks that have sent nothing before, one after the other. */
export function networks(): () => string {
  let n = 0;
  return () => {
    n += 1;
    return `10.${(n >> 16) & 255}.${(n >> 8) & 255}.${n & 255}`;
  };
}
