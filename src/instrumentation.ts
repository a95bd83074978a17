/** Runs once when the server starts; an error thrown here would leave a server that answers 500 to everything. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { startServices } = await import('./jobs/start-services');
  await startServices();
}
