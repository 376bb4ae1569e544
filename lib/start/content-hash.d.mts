export declare const contentHash: (salt?: string) => string;
