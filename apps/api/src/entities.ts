/** Every entity class, by feature. Features add theirs here. */
export const entities: (new () => object)[] = [];
