/** Whether this server answers. */
export function GET() {
  return Response.json({ status: 'up' });
}
