/** The part of functions.json that the local sheet goes by; the file is the same one that Excel reads. */
export interface ParameterMetadata {
  name: string;
  description: string;
  dimensionality?: "scalar" | "matrix";
  optional?: boolean;
}

export interface FunctionMetadata {
  id: string;
  name: string;
  description: string;
  parameters: ParameterMetadata[];
  result?: { dimensionality?: "scalar" | "matrix" };
}

export interface Metadata {
  functions: FunctionMetadata[];
}

export async function readMetadata(address: string): Promise<FunctionMetadata[]> {
  const response = await fetch(address);
  if (!response.ok) throw new Error(`functions.json could not be read (${response.status})`);
  return ((await response.json()) as Metadata).functions;
}
