import { getPhoto, putPhoto } from '@/lib/server/http/photo-route';

export const GET = getPhoto;
export const PUT = putPhoto;
