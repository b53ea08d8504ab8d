/** Version of the program, put in when it is bundled. */
declare const OXOMARGIN_VERSION: string | undefined;
export const VERSION: string = typeof OXOMARGIN_VERSION === "string" ? OXOMARGIN_VERSION : "0.0.0-source";
