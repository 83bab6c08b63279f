@echo off
rem Wellwright without a window: a plain Java program on the application's own jars.
setlocal EnableDelayedExpansion
set "BASE=%~dp0.."
set "CP=%BASE%\platform\lib\org-openide-util-lookup.jar;%BASE%\platform\lib\org-openide-util.jar;%BASE%\wellwright\modules\*"
for /d %%M in ("%BASE%\wellwright\modules\ext\*") do for /d %%G in ("%%M\*") do set "CP=!CP!;%%G\*"
endlocal & set "WELLWRIGHT_CP=%CP%"
java -XX:+UseSerialGC -Xshare:auto -Xlog:disable -Xss2m -Djava.awt.headless=true -cp "%WELLWRIGHT_CP%" org.wellwright.project.command.Main %*
