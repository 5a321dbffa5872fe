/** Version of the rules: stored with every result, raised whenever any rule may answer differently. */
export const ENGINE_VERSION = "1.0.0";

/** The one line that stands under every verdict. */
export const CAUTION =
  "This informs competent people and certifies nothing: look at the bolt yourself, follow its maker's instructions, local rules and qualified practice.";
