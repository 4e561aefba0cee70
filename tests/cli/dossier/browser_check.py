"""Opens a dossier in Chromium and looks at it as a reader does.

    /usr/bin/python3 browser_check.py RINGWARD

Needs Debian's chromium and chromium-driver, which is spoken to over HTTP; nothing else beyond the
standard library. Exit status: 0 all checks hold, 1 one does not, 77 no browser here.
"""

import base64
import json
import pathlib
import re
import shutil
import subprocess
import sys
import tempfile
import urllib.error
import urllib.request

COLUMN = """
title = "Column for the browser (invented example)"
[section]
shape = "circular"
diameter_mm = 200
[tube]
thickness_mm = 4
yield_MPa = 355
[core]
strength_MPa = 30
[[bars]]
count = 6
diameter_mm = 12
axis_mm = 35
yield_MPa = 500
[member]
length_mm = 2000
[load]
axial_kN = 400
[fire]
curve = "standard"
duration_min = 60
[numerics]
accuracy = "coarse"
"""
KEY_LEFT, KEY_HOME = "\ue012", "\ue011"
ELEMENT = "element-6066-11e4-a52e-4f735466cecf"  # the key of an element in WebDriver (W3C)

failures = []


def check(holds, claim):
    print(("ok    " if holds else "FAILS ") + claim)
    if not holds:
        failures.append(claim)


class Driver:
    """A running chromedriver."""

    def __init__(self):
        self.process = subprocess.Popen(
            ["chromedriver", "--port=0"], stdout=subprocess.PIPE, stderr=subprocess.DEVNULL,
            text=True)
        for line in self.process.stdout:
            port = re.search(r"successfully on port (\d+)", line)
            if port:
                self.root = "http://127.0.0.1:" + port.group(1)
                return
        raise RuntimeError("chromedriver did not start")

    def call(self, method, path, body=None):
        data = None if body is None else json.dumps(body).encode()
        request = urllib.request.Request(self.root + path, data=data, method=method,
                                         headers={"Content-Type": "application/json"})
        try:
            with urllib.request.urlopen(request, timeout=120) as answer:
                return json.load(answer)["value"]
        except urllib.error.HTTPError as problem:
            raise RuntimeError(problem.read().decode()) from problem

    def stop(self):
        self.process.terminate()
        self.process.wait()


class Session:
    """A browser window."""

    def __init__(self, driver, folder, with_scripts=True):
        self.driver = driver
        options = {
            "args": ["--headless=new", "--no-sandbox", "--disable-gpu", "--disable-dev-shm-usage",
                     "--window-size=1280,900", "--user-data-dir=" + str(folder)],
        }
        if not with_scripts:
            options["prefs"] = {"profile.managed_default_content_settings.javascript": 2}
        answer = driver.call("POST", "/session", {"capabilities": {"alwaysMatch": {
            "browserName": "chrome",
            "goog:chromeOptions": options,
            "goog:loggingPrefs": {"browser": "ALL", "performance": "ALL"}}}})
        self.path = "/session/" + answer["sessionId"]

    def post(self, path, body):
        return self.driver.call("POST", self.path + path, body)

    def open(self, page):
        self.post("/url", {"url": page.as_uri()})

    def run(self, script):
        return self.post("/execute/sync", {"script": script, "args": []})

    def devtools(self, command, parameters):
        return self.post("/goog/cdp/execute", {"cmd": command, "params": parameters})

    def press(self, selector, keys):
        element = self.post("/element", {"using": "css selector", "value": selector})[ELEMENT]
        self.post("/element/" + element + "/value", {"text": keys})

    def log(self, kind):
        return self.post("/se/log", {"type": kind})

    def text_of(self, selector):
        element = self.post("/element", {"using": "css selector", "value": selector})[ELEMENT]
        return self.driver.call("GET", self.path + "/element/" + element + "/text")

    def is_displayed(self, selector):
        element = self.post("/element", {"using": "css selector", "value": selector})[ELEMENT]
        return self.driver.call("GET", self.path + "/element/" + element + "/displayed")

    def close(self):
        self.driver.call("DELETE", self.path)


def check_network(session):
    requested = []
    for entry in session.log("performance"):
        message = json.loads(entry["message"])["message"]
        # A new window has requests of the browser's own.
        is_request = message["method"] == "Network.requestWillBeSent"
        if is_request and message["params"]["documentURL"].startswith("file:"):
            requested.append(message["params"]["request"]["url"])
    outside = [url for url in requested if not url.startswith(("file:", "data:"))]
    check(len([url for url in requested if url.startswith("file:")]) == 1,
          "the browser reads the page itself and no other file")
    check(not outside, "nothing is fetched from anywhere: " + str(outside))


def map_state(session):
    return session.run("""
        var figure = document.getElementById('map-figure');
        return {heading: figure.querySelector('.map-heading').textContent,
                shown: document.getElementById('map-shown').textContent,
                image: getComputedStyle(figure.querySelector('.map-image')).display,
                picture: figure.querySelector('.map-image').getAttribute('href') || '',
                field: getComputedStyle(figure.querySelector('.map-field')).display};""")


def check_slider(session):
    still = map_state(session)
    check(still["image"] == "none" and still["field"] != "none",
          "before the slider moves the map is the printed one, " + still["heading"])
    session.press("#map-time", KEY_LEFT)
    moved = map_state(session)
    check(moved["heading"] != still["heading"] and moved["shown"] == moved["heading"],
          "an arrow key moves the map to another time, " + moved["heading"])
    check(moved["image"] != "none" and moved["field"] == "none" and
          moved["picture"].startswith("data:image/png"), "the map of that time is drawn")
    session.press("#map-time", KEY_HOME)
    first = map_state(session)
    check(first["heading"].startswith("0 min") and first["picture"] != moved["picture"],
          "the first map is another picture, " + first["heading"])


def check_width(session, width):
    session.devtools("Emulation.setDeviceMetricsOverride",
                     {"width": width, "height": 900, "deviceScaleFactor": 1,
                      "mobile": width < 600})
    wide = session.run("return document.documentElement.scrollWidth")
    check(wide <= width, f"no scrolling sideways at {width} px (the page is {wide} px wide)")
    session.devtools("Emulation.clearDeviceMetricsOverride", {})


def check_contrast(session):
    """WCAG 2.1, 1.4.3: 4.5 to 1 for text (from memory)."""
    worst = session.run("""
        function light(colour) {
          var parts = colour.match(/[0-9.]+/g).slice(0, 3).map(function (part) {
            var c = part / 255;
            return c <= 0.03928 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
          });
          return 0.2126 * parts[0] + 0.7152 * parts[1] + 0.0722 * parts[2];
        }
        var worst = 21;
        document.querySelectorAll('main *').forEach(function (element) {
          if (element.closest('svg, script') || !element.innerText) return;
          worst = Math.min(worst, 1.05 / (light(getComputedStyle(element).color) + 0.05));
        });
        return worst;""")
    check(worst >= 4.5, f"the palest text has a contrast of {worst:.1f} to 1 on white")


def check_print(session, folder):
    session.devtools("Emulation.setEmulatedMedia", {"media": "print"})
    rows = session.run("""
        var cut = 0, tallest = 0;
        document.querySelectorAll('tr').forEach(function (row) {
          if (getComputedStyle(row).breakInside !== 'avoid') cut += 1;
          tallest = Math.max(tallest, row.getBoundingClientRect().height);
        });
        return {cut: cut, tallest: tallest, slider: getComputedStyle(
            document.getElementById('map-control')).display};""")
    check(rows["cut"] == 0 and rows["tallest"] < 600, "no row of a table can be cut by a page's end")
    check(rows["slider"] == "none", "the slider is not printed")
    session.devtools("Emulation.setEmulatedMedia", {"media": ""})
    printed = base64.b64decode(session.post("/print", {
        "page": {"width": 21.0, "height": 29.7}, "background": True}))
    path = folder / "printed.pdf"
    path.write_bytes(printed)
    information = subprocess.run(["pdfinfo", str(path)], capture_output=True, text=True, check=True)
    pages = int(re.search(r"Pages:\s+(\d+)", information.stdout).group(1))
    check(10 <= pages <= 22, f"the browser prints it on {pages} pages")


def check_without_scripts(session, page):
    session.open(page)
    check(not session.is_displayed("#map-control"), "without scripts there is no slider")
    check(session.is_displayed("#map-figure") and session.is_displayed("h1"),
          "without scripts the page and its map are there")
    heading = session.text_of("#map-figure .map-heading")
    check(re.match(r"[0-9.]+ min", heading) is not None,
          "without scripts the map shows the end, " + heading)


def main():
    if not all(shutil.which(name) for name in ("chromium", "chromedriver", "pdfinfo")):
        print("skipped: chromium, chromium-driver or poppler-utils is not installed")
        return 77
    with tempfile.TemporaryDirectory(ignore_cleanup_errors=True) as name:
        folder = pathlib.Path(name)
        page = folder / "page.html"
        made = subprocess.run([sys.argv[1], "dossier", "-", "-o", str(page), "--quiet"],
                              input=COLUMN, text=True, check=False)
        check(made.returncode == 0, "the dossier is made")
        driver = Driver()
        try:
            session = Session(driver, folder / "with")
            session.open(page)
            check_network(session)
            check_slider(session)
            for width in (1280, 390):
                check_width(session, width)
            check_contrast(session)
            check_print(session, folder)
            complaints = [entry["message"] for entry in session.log("browser")]
            check(not complaints, "the console is empty: " + str(complaints))
            session.close()
            without = Session(driver, folder / "without", with_scripts=False)
            check_without_scripts(without, page)
            without.close()
        finally:
            driver.stop()
    print(f"{len(failures)} of the checks fail")
    return 1 if failures else 0


if __name__ == "__main__":
    sys.exit(main())
