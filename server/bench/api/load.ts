import fs from 'node:fs';
import http from 'node:http';
import { quantile } from '../median.js';

export interface Question {
  url: string;
  method: 'GET' | 'POST';
  headers: Record<string, string>;
  body?: string;
  expectedStatus: number;
}

export interface Burst {
  requestsPerSecond: number;
  /** Of the server's process, µs */
  cpuPerRequest: number;
  /** ms */
  p50: number;
  p99: number;
}

const CONNECTIONS = 10;
/** Linux counts a process's CPU time in these. */
const TICK_US = 10_000;

/** User and system time of a process so far, µs. */
function cpuOf(pid: number): number {
  const fields = fs
    .readFileSync(`/proc/${pid}/stat`, 'utf8')
    .replace(/^.*\) /, '')
    .split(' ');
  return (Number(fields[11]) + Number(fields[12])) * TICK_US;
}

function ask(agent: http.Agent, question: Question): Promise<void> {
  return new Promise((resolve, reject) => {
    const { url, method, headers, body, expectedStatus } = question;
    const request = http.request(url, { agent, method, headers }, (response) => {
      response.on('error', reject);
      response.on('end', () => {
        if (response.statusCode === expectedStatus) resolve();
        else reject(new Error(`${url} answered ${response.statusCode}`));
      });
      response.resume();
    });
    request.on('error', reject);
    request.end(body);
  });
}

/** Asks the same question over and over on ten connections for a while. */
export async function burst(pid: number, question: Question, milliseconds: number): Promise<Burst> {
  const agent = new http.Agent({ keepAlive: true, maxSockets: CONNECTIONS });
  const times: number[] = [];
  const cpuBefore = cpuOf(pid);
  const begin = performance.now();
  const connection = async () => {
    while (performance.now() - begin < milliseconds) {
      const start = performance.now();
      await ask(agent, question);
      times.push(performance.now() - start);
    }
  };
  await Promise.all(Array.from({ length: CONNECTIONS }, connection));
  const elapsed = performance.now() - begin;
  const cpu = cpuOf(pid) - cpuBefore;
  agent.destroy();
  return {
    requestsPerSecond: (times.length / elapsed) * 1000,
    cpuPerRequest: cpu / times.length,
    p50: quantile(times, 0.5),
    p99: quantile(times, 0.99),
  };
}
