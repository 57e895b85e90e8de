/** Version of the computation: raised whenever any figure or verdict could change. */
export const ENGINE_VERSION = '1.0.0';
