"""A throw-away user profile with the extension in it.

The extension tool refuses to run as root. Root therefore runs it inside a user namespace, where it
is somebody else; a normal user runs it as it is.
"""

import os
import shutil
import subprocess
import tempfile

from harness.office import Office, file_url, program_folder

NO_NAMESPACE = (
    "The extension tool (unopkg) refuses to run as root, and this machine gives no user namespace "
    "to run it in another name. Run the tests as a normal user, or allow user namespaces "
    "(sysctl kernel.unprivileged_userns_clone=1; in a container, its seccomp profile)."
)


class CannotInstall(RuntimeError):
    """The extension does not go into the profile; the message says why."""


def _as_somebody_else():
    """The command prefix that makes root a normal user, empty for a normal user."""
    if os.geteuid() != 0:
        return []
    prefix = ["unshare", "--user", "--map-user=1000", "--map-group=1000"]
    if shutil.which("unshare") is None:
        raise CannotInstall(NO_NAMESPACE)
    if subprocess.run([*prefix, "true"], capture_output=True, check=False).returncode != 0:
        raise CannotInstall(NO_NAMESPACE)
    return prefix


def run_unopkg(profile, *arguments):
    """Runs unopkg on a profile and returns what it printed."""
    tool = os.path.join(program_folder(), "unopkg")
    command = [
        *_as_somebody_else(),
        tool,
        *arguments,
        "-env:UserInstallation=" + file_url(profile),
    ]
    done = subprocess.run(
        command, capture_output=True, text=True, timeout=120, check=False, stdin=subprocess.DEVNULL
    )
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
