export declare function appUrlOf(ownerUrl: string, secret: string): string;
