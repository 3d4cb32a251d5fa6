"""A throw-away user profile with the extension in it.

The extension tool refuses to run as root. Root therefore runs it inside a user namespace, where it
is somebody else, or as the user nobody where a container forbids namespaces; a normal user runs it
as it is.
"""

import os
import shutil
import subprocess
import tempfile

from harness.office import Office, file_url, program_folder

NOBODY = 65534  # Debian's nobody and nogroup

NEITHER = (
    "The extension tool (unopkg) refuses to run as root, and this machine lets root neither open a user "
    "namespace nor become the user nobody. Run this as a normal user."
)


class CannotInstall(RuntimeError):
    """The extension does not go into the profile; the message says why."""


def _works(*command):
    """Whether a command is there and succeeds."""
    if shutil.which(command[0]) is None:
        return False
    return subprocess.run(command, capture_output=True, check=False).returncode == 0


def _as_somebody_else():
    """The command prefix that makes root another user, and the owner that files need for it."""
    if os.geteuid() != 0:
        return [], None
    namespace = ["unshare", "--user", "--map-user=1000", "--map-group=1000"]
    if _works(*namespace, "true"):
        return namespace, None
    nobody = ["setpriv", f"--reuid={NOBODY}", f"--regid={NOBODY}", "--clear-groups"]
    if _works(*nobody, "true"):
        return nobody, NOBODY
    raise CannotInstall(NEITHER)


def _give(folder, owner):
    """Gives a folder and all in it to a user and the group of the same number."""
    os.chown(folder, owner, owner)
    for place, folders, files in os.walk(folder):
        for name in folders + files:
            os.chown(os.path.join(place, name), owner, owner, follow_symlinks=False)


def run_unopkg(profile, *arguments):
    """Runs unopkg on a profile and returns what it printed. File names must be absolute."""
    prefix, owner = _as_somebody_else()
    environment = dict(os.environ)
    copies = []
    if owner is not None:
        # Nobody may read the profile, a copy of the extension in it, and no home of root's.
        environment["HOME"] = profile
        given, arguments = arguments, []
        for argument in given:
            if os.path.isfile(argument):
                argument = shutil.copy(argument, profile)
                copies.append(argument)
            arguments.append(argument)
        _give(profile, owner)
    tool = os.path.join(program_folder(), "unopkg")
    command = [*prefix, tool, *arguments, "-env:UserInstallation=" + file_url(profile)]
    try:
        done = subprocess.run(
            command,
            capture_output=True,
            text=True,
            timeout=120,
            check=False,
            stdin=subprocess.DEVNULL,
            env=environment,
            cwd=profile,  # nobody may not be let into the folder where root stands
        )
    finally:
        if owner is not None:
            _give(profile, 0)
        for copy in copies:
            os.unlink(copy)
    if done.returncode != 0:
        raise CannotInstall(
            f"unopkg {' '.join(arguments)} ended with {done.returncode}:\n{done.stdout}{done.stderr}"
        )
    return done.stdout


class Profile:
    """A profile folder that vanishes with `remove()`. `with_extension` installs an .oxt into it."""

    def __init__(self, folder=None):
        self._own = folder is None
        self.folder = folder or tempfile.mkdtemp(prefix="busbar-profile-")

    def with_extension(self, oxt):
        if not os.path.isfile(oxt):
            raise CannotInstall(f"{oxt} does not exist: build the target `oxt` first")
        # A profile must have been started once before: an extension that goes into a fresh one is
        # not registered on its first start.
        Office(self.folder).close()
        run_unopkg(self.folder, "add", "-s", "-f", os.path.abspath(oxt))
        return self

    def remove(self):
        if self._own:
            shutil.rmtree(self.folder, ignore_errors=True)

    def __enter__(self):
        return self

    def __exit__(self, *_):
        self.remove()
