import { saveFile } from './delimited';
import { HttpProblem } from './http';
import { accessToken } from './session';

/** Saves a file that only its reader may see: the request carries the access token, which a plain link cannot. */
export async function downloadFile(path: string, name: string): Promise<void> {
  const token = accessToken();
  const response = await fetch(path, { headers: token ? { Authorization: `Bearer ${token}` } : {} });
  if (!response.ok) throw new HttpProblem(response.status, `The file could not be fetched (${response.status}).`);
  saveFile(name, await response.blob());
}
