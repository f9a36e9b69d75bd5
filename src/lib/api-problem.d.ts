import { type Problem } from '../../shared/contract/problem';
/** An error answer of the server, with every issue of the input by JSON pointer (RFC 9457, RFC 6901). */
export declare class ApiProblem extends Error {
    readonly problem: Problem;
    constructor(problem: Problem);
    get code(): string;
    get status(): number;
    get title(): string;
    get detail(): string;
    get issues(): Problem['issues'];
}
/** The request never got an answer. */
export declare const buildUnreachableProblem: () => ApiProblem;
/** The answer is not what the contract says: page and server are of different versions. */
export declare const buildUnexpectedAnswerProblem: (status: number) => ApiProblem;
/** Reads a problem+json body; anything else becomes an unexpected answer with its status. */
export declare function readProblem(status: number, body: unknown): ApiProblem;
