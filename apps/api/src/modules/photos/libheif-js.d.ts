/** The few calls of libheif's WebAssembly build that we use; the package brings no types for them. */
declare module 'libheif-js/wasm-bundle.js' {
  interface HeifImage {
    get_width(): number;
    get_height(): number;
    is_primary(): boolean;
    display(
      into: { data: Uint8ClampedArray; width: number; height: number },
      done: (shown: object | null) => void,
    ): void;
  }
  const libheif: {
    HeifDecoder: new () => { decode(bytes: Uint8Array): HeifImage[] };
  };
  export default libheif;
}
