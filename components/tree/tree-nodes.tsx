"use client";

import { Handle, Position, type Node, type NodeProps } from "@xyflow/react";
import { memo } from "react";
import type { Cause, Remedy, Symptom } from "@/lib/core/tree/schema";
import type { DrawnCheck } from "./drawn-part";
import { heightOf } from "./tree-layout";

// Outlines are ours and carry the meaning; colour repeats it. A pennant is a symptom, a ticket with its findings as rows a
// check, a plate with clipped corners a cause, a tag with a hole a remedy.

export type SymptomNode = Node<{ symptom: Symptom }, "symptom">;
export type CheckNode = Node<{ drawn: DrawnCheck }, "check">;
export type CauseNode = Node<{ cause: Cause; base: string }, "cause">;
export type RemedyNode = Node<{ remedy: Remedy }, "remedy">;

/** Unseen in a picture that is only looked at; a dot to drag from where links are made. */
const port =
  "!size-1 !min-h-0 !min-w-0 !border-0 !bg-transparent [&.connectable]:!size-3.5 [&.connectable]:!border-[1.5px] [&.connectable]:!border-edge [&.connectable]:!bg-sheet";

const Pennant = memo(function Pennant({ data, isConnectable }: NodeProps<SymptomNode>) {
  return (
    <div className="h-full bg-deep py-3 pr-6 pl-3.5 font-semibold text-on-deep [clip-path:polygon(0_0,100%_0,calc(100%-13px)_50%,100%_100%,0_100%)]">
      {data.symptom.title}
      <Handle type="source" position={Position.Right} isConnectable={isConnectable} className={port} />
    </div>
  );
});

const Ticket = memo(function Ticket({ data: { drawn }, isConnectable }: NodeProps<CheckNode>) {
  const { check, findings, folded } = drawn;
  let y = heightOf.checkHead(check.title);
  return (
    <div className="h-full rounded-node border-[1.5px] border-ink-2 bg-sheet">
      <b className="block px-3 py-2 font-semibold" style={{ height: y }}>
        {check.title}
      </b>
      {findings.map((finding) => {
        const height = heightOf.findingRow(finding.title);
        const middle = y + height / 2;
        y += height;
        return (
          <div key={finding.key} className="border-t border-rule px-3 py-1 text-ink-2" style={{ height }}>
            {finding.title}
            <Handle
              id={finding.key}
              type="source"
              position={Position.Right}
              isConnectable={isConnectable}
              className={port}
              style={{ top: middle }}
            />
          </div>
        );
      })}
      {folded > 0 && (
        <div className="border-t border-rule px-3 py-1 text-ink-2">{folded === 1 ? "1 other finding" : `${folded} other findings`}</div>
      )}
    </div>
  );
});

const Plate = memo(function Plate({ data, isConnectable }: NodeProps<CauseNode>) {
  return (
    <div className="h-full bg-plate px-4 py-2.5 text-on-plate [clip-path:polygon(11px_0,calc(100%-11px)_0,100%_11px,100%_calc(100%-11px),calc(100%-11px)_100%,11px_100%,0_calc(100%-11px),0_11px)]">
      <Handle type="target" position={Position.Left} isConnectable={isConnectable} className={port} />
      <b className="block font-semibold">{data.cause.title}</b>
      <span>{data.base}</span>
      <Handle type="source" position={Position.Right} isConnectable={isConnectable} className={port} />
    </div>
  );
});

const Tag = memo(function Tag({ data, isConnectable }: NodeProps<RemedyNode>) {
  return (
    <div className="flex h-full items-center rounded-l-full rounded-r-lg bg-sound-wash py-2 pr-3 pl-8 font-semibold text-ink night:border night:border-sound">
      <Handle type="target" position={Position.Left} isConnectable={isConnectable} className={port} />
      <span aria-hidden className="absolute left-3 size-2.5 rounded-full border-[1.5px] border-sound bg-paper" />
      {data.remedy.title}
    </div>
  );
});

/** A module constant: a new object on each render would mount every node anew. */
export const nodeTypes = { symptom: Pennant, check: Ticket, cause: Plate, remedy: Tag };
