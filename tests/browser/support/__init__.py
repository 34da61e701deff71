"""Real browsers behind one small interface, for the tests of the finished site.

Takes the site's folder. Gives a `Tab` (tab.py) in Chromium or Firefox, from `file://` or over http.
Next: tests/browser/conftest.py makes the fixtures.
"""
