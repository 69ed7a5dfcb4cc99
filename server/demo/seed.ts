/** Fills an empty database with the demo club. */
export async function seedDemo(_uploadsDir: string): Promise<void> {}
