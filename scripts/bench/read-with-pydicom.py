"""Times pydicom on one X-Ray Radiation Dose SR: reading the file and walking it to a table of events.

Usage: python3 read-with-pydicom.py FILE EVENTS TIMES
Prints the seconds of each time as one JSON list. Ends with an error unless the table has EVENTS rows.
"""

import json
import sys
import time

import pydicom

KEYWORDS = {"TEXT": "TextValue", "UIDREF": "UID", "DATETIME": "DateTime", "PNAME": "PersonName"}


def value_of(item):
    if item.ValueType == "NUM":
        measured = item.MeasuredValueSequence
        if not measured:
            return None
        return float(measured[0].NumericValue), measured[0].MeasurementUnitsCodeSequence[0].CodeValue
    if item.ValueType == "CODE":
        return item.ConceptCodeSequence[0].CodeValue
    keyword = KEYWORDS.get(item.ValueType)
    return str(item.get(keyword)) if keyword else None


def fill(row, container):
    for item in container.get("ContentSequence", []):
        if item.ValueType == "CONTAINER":
            fill(row, item)
        else:
            row.setdefault(item.ConceptNameCodeSequence[0].CodeValue, []).append(value_of(item))
    return row


def table_of_events(path):
    report = pydicom.dcmread(path)
    return [
        fill({}, item)
        for item in report.ContentSequence
        if item.ValueType == "CONTAINER" and item.ConceptNameCodeSequence[0].CodeValue == "113706"
    ]


path, events, times = sys.argv[1], int(sys.argv[2]), int(sys.argv[3])
seconds = []
for _ in range(times):
    started = time.perf_counter()
    table = table_of_events(path)
    seconds.append(time.perf_counter() - started)
    if len(table) != events:
        sys.exit(f"{len(table)} events in place of {events}")
print(json.dumps(seconds))
