/** A mail address as far as it can be told by looking; addresses inside a plant may lack a dot. */
export const EMAIL_PATTERN = /^[^@\s]{1,64}@[^@\s]{1,189}$/;

/** Addresses are kept and compared in lower case. */
export const canonicalEmail = (email: string): string => email.trim().toLowerCase();
