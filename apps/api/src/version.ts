/** Version of the product, as the health page and records name it. */
export const VERSION = '0.1.0';
