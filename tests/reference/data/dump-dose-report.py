"""Prints, with pydicom alone, what X-Ray Radiation Dose SR files hold: one JSON line a file.

Usage: python3 dump-dose-report.py FILE...
Every NUM of an event or of a plane's totals as [concept code, decimal string, unit code, unit scheme], in order of
the file, and every other value by its concept.
"""

import json
import sys

import warnings

import pydicom

warnings.simplefilter("ignore")


def code_of(item, keyword):
    sequence = item.get(keyword)
    if not sequence:
        return None
    code = sequence[0]
    value = code.get("CodeValue") or code.get("LongCodeValue") or code.get("URNCodeValue")
    return [str(value), str(code.get("CodingSchemeDesignator", "") or ""), str(code.get("CodeMeaning", "") or "")]


def concept_of(item):
    """Code value of the concept; private ones carry their scheme, so that they are never taken for others."""
    code = code_of(item, "ConceptNameCodeSequence")
    if code is None:
        return ""
    return code[1] + ":" + code[0] if code[1].startswith("99") else code[0]


def decimal_string(value):
    return getattr(value, "original_string", None) or str(value)


def numbers(item):
    found = []
    for child in item.get("ContentSequence", []):
        value_type = child.get("ValueType")
        if value_type == "NUM":
            for measured in child.get("MeasuredValueSequence", []):
                # The raw bytes: pydicom would refuse to make a number of "0,0042".
                text = measured.get_item("NumericValue").value
                text = text.decode("ascii") if isinstance(text, bytes) else decimal_string(text or "")
                unit = code_of(measured, "MeasurementUnitsCodeSequence")
                found.append([concept_of(child), text.strip(), *(unit[:2] if unit else [None, None])])
        elif value_type == "CONTAINER":
            found.extend(numbers(child))
    return found


TEXT_KEYWORDS = {"TEXT": "TextValue", "UIDREF": "UID", "DATETIME": "DateTime", "PNAME": "PersonName"}
CLOSED = {"113702", "113706", "113771", "122505"}


def value_of(item):
    value_type = item.get("ValueType")
    if value_type == "CODE":
        return code_of(item, "ConceptCodeSequence")
    if value_type == "IMAGE":
        references = item.get("ReferencedSOPSequence") or [{}]
        frames = references[0].get("ReferencedFrameNumber")
        frames = [] if frames is None else [int(one) for one in (frames if hasattr(frames, "__iter__") else [frames])]
        return [str(references[0].get("ReferencedSOPClassUID")), str(references[0].get("ReferencedSOPInstanceUID")), frames]
    text = item.get(TEXT_KEYWORDS.get(value_type, "ValueType")) if value_type in TEXT_KEYWORDS else None
    return str(text) if text not in (None, "") else None


def values_of(item, found=None, prefix=""):
    """Every value that is no number, by concept; what hangs below a value stands under "concept>concept"."""
    found = {} if found is None else found
    for child in item.get("ContentSequence", []):
        concept = concept_of(child)
        if child.get("ValueType") == "CONTAINER":
            if concept not in CLOSED:
                values_of(child, found, prefix)
            continue
        value = value_of(child)
        if value is not None:
            found.setdefault(prefix + concept, []).append(value)
        if prefix == "":
            values_of(child, found, concept + ">")
    return found


def containers(item, code):
    found = []
    for child in item.get("ContentSequence", []):
        if child.get("ValueType") == "CONTAINER":
            matches = concept_of(child) == code
            found.extend([child] if matches else containers(child, code))
    return found


def dump(path):
    dataset = pydicom.dcmread(path, force=True)
    parts = {
        name: [{"numbers": numbers(one), "values": values_of(one)} for one in containers(dataset, code)]
        for name, code in (("totals", "113702"), ("events", "113706"))
    }
    keywords = "SOPInstanceUID SOPClassUID StudyInstanceUID AccessionNumber StudyDescription PatientName PatientID"
    keywords += " PatientBirthDate PatientSex PatientSize PatientWeight StationName InstitutionName"
    header = {keyword: str(dataset.get(keyword, "") or "") for keyword in keywords.split()}
    if dataset.get("SpecificCharacterSet") == "GB18030":
        # pydicom 2.3 splits at a second byte that looks like a backslash; Python's own codec does not.
        raw = pydicom.dcmread(path, force=True).get_item("PatientName").value
        header["PatientName"] = raw.decode("gb18030").strip()
    return {"file": path, "header": header, "root": values_of(dataset), **parts}


for path in sys.argv[1:]:
    print(json.dumps(dump(path)))
