"""Prints, with pydicom alone, what X-Ray Radiation Dose SR files hold: one JSON line a file.

Usage: python3 dump-dose-report.py FILE...
Every NUM of an event or of a plane's totals as [concept code, decimal string, unit code], in order of the file.
"""

import json
import sys

import pydicom


def code_of(item, keyword):
    sequence = item.get(keyword)
    if not sequence:
        return None
    code = sequence[0]
    value = code.get("CodeValue") or code.get("LongCodeValue") or code.get("URNCodeValue")
    return [str(value), str(code.get("CodingSchemeDesignator", "")), str(code.get("CodeMeaning", ""))]


def decimal_string(value):
    return getattr(value, "original_string", None) or str(value)


def numbers(item):
    found = []
    for child in item.get("ContentSequence", []):
        if child.ValueType == "NUM":
            for measured in child.get("MeasuredValueSequence", []):
                # The raw bytes: pydicom would refuse to make a number of "0,0042".
                text = measured.get_item("NumericValue").value
                text = text.decode("ascii") if isinstance(text, bytes) else decimal_string(text)
                unit = code_of(measured, "MeasurementUnitsCodeSequence")
                found.append([code_of(child, "ConceptNameCodeSequence")[0], text.strip(), unit[0] if unit else None])
        elif child.ValueType == "CONTAINER":
            found.extend(numbers(child))
    return found


def values_of(item):
    result = {}
    for child in item.get("ContentSequence", []):
        concept = code_of(child, "ConceptNameCodeSequence")
        if child.ValueType == "CODE":
            value = code_of(child, "ConceptCodeSequence")
        else:
            keyword = {"TEXT": "TextValue", "UIDREF": "UID", "DATETIME": "DateTime"}.get(child.ValueType)
            value = str(child.get(keyword)) if keyword else None
        if value is not None:
            result.setdefault(concept[0], value)
    return result


def containers(item, code):
    found = []
    for child in item.get("ContentSequence", []):
        if child.ValueType == "CONTAINER":
            matches = code_of(child, "ConceptNameCodeSequence")[0] == code
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
    return {"file": path, "header": header, **parts}


for path in sys.argv[1:]:
    print(json.dumps(dump(path)))
